using Auditor.Engine.Evidence;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Model;

/// <summary>Turns what a value was computed from into what reports show of it.</summary>
/// <param name="places">Names places.</param>
/// <param name="anchors">Ids of the workings in the report, by subject and symbol.</param>
internal sealed class SourceReader(Places places, IReadOnlyDictionary<string, string> anchors)
{
    public ReportSource Read(EvidenceSource source)
    {
        var isQuantity = source.Kind == EvidenceKind.Quantity;
        return new ReportSource(
            Word(source.Kind), Label(source), source.Text, places.OfText(source.Place), isQuantity ? "" : source.Remark,
            isQuantity ? anchors.GetValueOrDefault(source.Label, "") : "");
    }

    /// <summary>The key of the installation is a dash, which says little beside a symbol.</summary>
    private static string Label(EvidenceSource source) =>
        source.Label.StartsWith("- ", StringComparison.Ordinal) ? "installation" + source.Label[1..] : source.Label;

    private static string Word(EvidenceKind kind) => kind switch
    {
        EvidenceKind.Input => "design",
        EvidenceKind.Quantity => "quantity",
        EvidenceKind.Parameter => "parameter",
        EvidenceKind.Cell => "table",
        EvidenceKind.Curve => "curve",
        _ => "missing",
    };
}
