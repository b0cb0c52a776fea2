using Auditor.Engine.Adjustments;
using Auditor.Engine.Remedies;
using Auditor.Reports.Json;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Remedies;

/// <summary>Writes remedies for programs, as <c>remedies.schema.json</c> describes them.</summary>
public static class RemediesJson
{
    private const int Format = 1;

    /// <summary>Writes the file.</summary>
    /// <returns>Indented JSON in UTF-8 without a byte order mark; lines end with LF.</returns>
    public static byte[] Write(RemedyResult result) => Invariantly.Make(() => Whole(result));

    private static byte[] Whole(RemedyResult result)
    {
        using var stream = new MemoryStream();
        using (var output = new JsonOutput(stream, new Places(result.Audit.Design.File)))
        {
            output.Object(null, () =>
            {
                output.Whole("format", Format);
                FileHead.Write(output, result.Audit.Design);
                output.Text("decision", AuditBasis.Word(result.Audit.Decision));
                output.Array("findings", result.Findings, each => output.Object(null, () => Finding(output, each)));
            });
        }

        stream.WriteByte((byte)'\n');
        return stream.ToArray();
    }

    private static void Finding(JsonOutput output, FindingRemedies each)
    {
        output.Text("key", each.Finding.Key);
        output.Text("verdict", each.Finding.VerdictText);
        output.Text("message", each.Finding.Message);
        output.Whole("tried", each.Tried);
        output.Texts("obstacles", each.Obstacles.Select(at => at.Key));
        output.Array("remedies", each.Remedies, remedy => output.Object(null, () => Remedy(output, remedy)));
    }

    /// <summary>Writes one remedy.</summary>
    internal static void Remedy(JsonOutput output, Remedy remedy)
    {
        output.Array("changes", remedy.Changes, change => output.Object(null, () =>
        {
            output.Text("adjustment", change.Place.Adjustment.Id);
            output.Text("subject", change.Place.Subject.Key);
            output.Text("text", RemedyText.Change(change));
        }));
        output.Array("inputs", remedy.Inputs, changed => output.Object(null, () => Input(output, changed)));
        output.Whole("effort", remedy.Effort);
        output.Number("before", remedy.Before?.Relative ?? remedy.Before?.Absolute);
        output.Number("after", remedy.After?.Relative ?? remedy.After?.Absolute);
        output.Array("worsened", remedy.Worsened, move => output.Object(null, () =>
        {
            output.Text("key", move.At.Key);
            output.Number("before", move.Before.Relative ?? move.Before.Absolute);
            output.Number("after", move.After.Relative ?? move.After.Absolute);
        }));
        output.Texts("alsoRight", remedy.AlsoRight.Select(at => at.Key));
        output.Texts("open", remedy.Open.Select(at => at.Key));
        output.Whole("rechecked", remedy.Rechecked);
    }

    private static void Input(JsonOutput output, ChangedInput changed)
    {
        var slot = changed.Input.Slot;
        output.Text("subject", changed.Input.Subject.Key);
        output.Text("input", slot.Path);
        output.Text("unit", slot.Unit?.Symbol);
        output.Value("before", changed.Input.Stated, slot.Unit);
        output.Value("after", changed.After, slot.Unit);
    }
}
