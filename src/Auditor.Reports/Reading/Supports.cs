using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Reports.Reading;

/// <summary>What the findings of an audit rest on that a reader should know to be less than certain.</summary>
internal sealed class Supports
{
    private readonly Foundations _foundations;
    private readonly Lazy<IReadOnlyList<AssumedInput>> _assumed;
    private readonly Lazy<IReadOnlyList<(string Name, string Text, IReadOnlyList<string> Findings)>> _memory;

    public Supports(AuditResult result)
    {
        _foundations = new Foundations(result);
        _assumed = new(() => AssumedIn(result));
        _memory = new(() =>
        [
            .. Users(result, FoundationKind.FigureFromMemory)
                .OrderBy(group => group.Key.Name, StringComparer.Ordinal).ThenBy(group => group.Key.Text, StringComparer.Ordinal)
                .Select(group => (group.Key.Name, group.Key.Text, (IReadOnlyList<string>)[.. group])),
        ]);
    }

    /// <summary>Inputs marked as assumed, in the order of the design, with the keys of the findings that hang on each.</summary>
    public IReadOnlyList<AssumedInput> Assumed => _assumed.Value;

    /// <summary>Figures from memory, by name, with the keys of the findings that rest on each.</summary>
    public IReadOnlyList<(string Name, string Text, IReadOnlyList<string> Findings)> Memory => _memory.Value;

    /// <summary>What one finding rests on.</summary>
    public IReadOnlyList<Foundation> Of(Finding finding) => _foundations.Of(finding);

    private IReadOnlyList<AssumedInput> AssumedIn(AuditResult result)
    {
        var inputs = result.Design.Subjects
            .SelectMany(subject => subject.Shape.Inputs.Where(slot => IsAssumed(subject, slot)).Select(slot => StatedInput.Of(subject, slot))).OfType<StatedInput>().ToArray();
        if (inputs.Length == 0)
        {
            return [];
        }

        var users = Users(result, FoundationKind.AssumedInput);
        return [.. inputs.Select(input => new AssumedInput(input, [.. users[(input.Subject.Key, input.Slot.Path, input.Text)]]))];
    }

    /// <summary>The keys of the findings that rest on each foundation of a kind.</summary>
    private ILookup<(string? Subject, string Name, string Text), string> Users(AuditResult result, FoundationKind kind) =>
        result.Findings
            .SelectMany(finding => Of(finding).Where(foundation => foundation.Kind == kind).Select(foundation => (foundation, finding.Key)))
            .ToLookup(pair => (pair.foundation.Subject, pair.foundation.Name, pair.foundation.Text), pair => pair.Key);

    private static bool IsAssumed(DesignSubject subject, InputSlot slot) =>
        slot.Type.Kind == FormulaKind.Quantity && subject.Input(slot.Index).Marks.HasFlag(Marks.Assumed);

    /// <summary>An assumed input and the findings that hang on it.</summary>
    internal sealed record AssumedInput(StatedInput Input, IReadOnlyList<string> Findings);
}
