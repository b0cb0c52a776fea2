using Auditor.Engine.Adjustments;
using Auditor.Engine.Findings;
using Auditor.Engine.Remedies;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Remedies;

/// <summary>Says remedies in words.</summary>
public static class RemedyText
{
    private const int MostNamed = 3;

    /// <summary>The changes of a remedy, joined.</summary>
    public static string Changes(Remedy remedy) => string.Join(" and ", remedy.Changes.Select(Change));

    /// <summary>One change: what, where, from which value to which.</summary>
    public static string Change(Change change)
    {
        var (adjustment, subject) = (change.Place.Adjustment, change.Place.Subject);
        var where = subject.Parent is null ? "" : $" of {SubjectText.Label(subject)}";
        var after = InputValue(change.Value, adjustment.Slot);
        return adjustment.Remedy!.Adds
            ? $"{adjustment.Label}{where}: add one, {after}"
            : $"{adjustment.Label}{where}: {InputValue(change.Place.Stated, adjustment.Slot)} to {after}";
    }

    /// <summary>An input that changes, as a person writes it: <c>MSB/3 cable.csa 2.5 mm² to 4 mm²</c>.</summary>
    public static string Input(ChangedInput changed)
    {
        var (subject, slot) = changed.Input;
        var before = changed.Input.Stated;
        return $"{subject.Key} {slot.Path}: {(before.IsMissing ? "none" : InputValue(before, slot))} to {InputValue(changed.After, slot)}";
    }

    /// <summary>The margin before and after, in the measure of the finding; empty where nothing is measured.</summary>
    public static string Margins(Remedy remedy, Rule rule)
    {
        var before = remedy.Before is { } stated ? Margin(stated, rule) : "";
        var after = remedy.After is { } changed ? Margin(changed, rule) : "";
        return (before, after, remedy.Verdict) switch
        {
            (_, _, null) => "the rule no longer applies",
            ("", "", _) => "",
            ("", _, _) => $"margin {after}",
            (_, "", _) => $"margin {before} before",
            _ => $"margin {before} to {after}",
        };
    }

    /// <summary>What a remedy does besides, one sentence each.</summary>
    public static IReadOnlyList<string> Besides(Remedy remedy)
    {
        var lines = new List<string>();
        if (remedy.AlsoRight.Count > 0)
        {
            lines.Add($"also puts right {Named(remedy.AlsoRight.Select(at => at.Key))}");
        }

        if (remedy.Worsened.Count > 0)
        {
            lines.Add("leaves less margin in " + Named(remedy.Worsened.Select(move => $"{move.At.Key} ({Margin(move.Before, move.At.Rule)} to {Margin(move.After, move.At.Rule)})")));
        }

        if (remedy.Open.Count > 0)
        {
            lines.Add($"leaves open, for want of input, {Named(remedy.Open.Select(at => at.Key))}");
        }

        return lines;
    }

    /// <summary>The remedy of least change with its margins, or why there is none.</summary>
    public static string Nearest(FindingRemedies each) => each.Remedies is [var remedy, ..]
        ? string.Join("; ", new[] { Changes(remedy), Margins(remedy, each.Finding.Rule) }.Concat(Besides(remedy)).Where(text => text.Length > 0))
        : $"none proven: {None(each)}";

    /// <summary>Why a finding has no proven remedy; empty where it has one.</summary>
    public static string None(FindingRemedies each) => each switch
    {
        { Remedies.Count: > 0 } => "",
        { Tried: 0 } => "the rule set declares no adjustment that has a part in this rule",
        { Obstacles: [] } => $"none of the {each.Tried} adjustments tried, singly and in pairs, puts it right",
        _ => $"of the {each.Tried} adjustments tried, singly and in pairs, those that put it right break other rules or leave them open: " +
            Named(each.Obstacles.Select(at => at.Key)),
    };

    private static string Named(IEnumerable<string> names)
    {
        var all = names.ToArray();
        return string.Join(", ", all.Take(MostNamed)) + (all.Length > MostNamed ? $" and {all.Length - MostNamed} more" : "");
    }

    private static string Margin(Margin margin, Rule rule) =>
        margin.Relative is { } share ? ValueText.ShowMargin(share) : ValueText.ShowNumber(margin.Absolute, MarginUnit.Of(rule.Check.Unit!));

    private static string InputValue(in Value value, InputSlot slot) => value.IsMissing ? "none" : ValueText.Show(value, slot.Unit);
}
