using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Reports.Reading;

/// <summary>What the findings of an audit rest on that a reader should know to be less than certain.</summary>
internal sealed class Supports
{
    private readonly Dictionary<Finding, IReadOnlyList<Foundation>> _ofFinding;

    public Supports(AuditResult result)
    {
        var foundations = new Foundations(result);
        _ofFinding = result.Findings.ToDictionary(finding => finding, foundations.Of);
        var users = result.Findings
            .SelectMany(finding => _ofFinding[finding].Select(foundation => (foundation, finding.Key)))
            .ToLookup(pair => (pair.foundation.Kind, pair.foundation.Subject, pair.foundation.Name, pair.foundation.Text), pair => pair.Key);
        Assumed = [.. result.Design.Subjects.SelectMany(StatedInput.Of).Where(IsAssumed)
            .Select(input => new AssumedInput(input, [.. users[(FoundationKind.AssumedInput, input.Subject.Key, input.Slot.Path, input.Text)]]))];
        Memory = [.. users.Where(group => group.Key.Kind == FoundationKind.FigureFromMemory)
            .OrderBy(group => group.Key.Name, StringComparer.Ordinal).ThenBy(group => group.Key.Text, StringComparer.Ordinal)
            .Select(group => (group.Key.Name, group.Key.Text, (IReadOnlyList<string>)[.. group]))];
    }

    /// <summary>Inputs marked as assumed, in the order of the design, with the keys of the findings that hang on each.</summary>
    public IReadOnlyList<AssumedInput> Assumed { get; }

    /// <summary>Figures from memory, by name, with the keys of the findings that rest on each.</summary>
    public IReadOnlyList<(string Name, string Text, IReadOnlyList<string> Findings)> Memory { get; }

    /// <summary>What one finding rests on.</summary>
    public IReadOnlyList<Foundation> Of(Finding finding) => _ofFinding[finding];

    private static bool IsAssumed(StatedInput input) =>
        input.Slot.Type.Kind == FormulaKind.Quantity && input.Subject.Input(input.Slot.Index).Marks.HasFlag(Marks.Assumed);

    /// <summary>An assumed input and the findings that hang on it.</summary>
    internal sealed record AssumedInput(StatedInput Input, IReadOnlyList<string> Findings);
}
