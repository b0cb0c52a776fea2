using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.Limits;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Reports.Limits;

/// <summary>Shows bounds of inputs.</summary>
public static class LimitText
{
    /// <summary>A value of an input; empty where it is missing.</summary>
    public static string Value(in Value value, InputSlot slot) => value.IsMissing ? "" : ValueText.Show(value, slot.Unit);

    /// <summary>A lower bound, rounded upward; empty for none.</summary>
    public static string Least(LimitEdge? edge, InputSlot slot) => Bound(edge, slot, isMost: false);

    /// <summary>An upper bound, rounded downward; empty for none.</summary>
    public static string Most(LimitEdge? edge, InputSlot slot) => Bound(edge, slot, isMost: true);

    /// <summary>A stretch in words; empty where nothing bounds it.</summary>
    public static string Range(LimitEdge? least, LimitEdge? most, InputSlot slot) => (least, most) switch
    {
        (null, null) => "",
        (null, _) => $"at most {Most(most, slot)}",
        (_, null) => $"at least {Least(least, slot)}",
        _ => $"{Least(least, slot)} to {Most(most, slot)}",
    };

    /// <summary>The rule, with the subject that it judges where that is another.</summary>
    public static string Rule(RuleLimit rule, DesignSubject subject) =>
        rule.At.Subject == subject ? rule.At.Rule.Id : $"{rule.At.Rule.Id} at {Place(rule.At.Subject)}";

    /// <summary>The rule of a bound; empty for none.</summary>
    public static string Rule(LimitBound? bound, DesignSubject subject) => bound is null ? "" : Rule(bound.Rule, subject);

    private static string Place(DesignSubject subject) => subject.Parent is null ? "the origin" : subject.Key;

    private static string Bound(LimitEdge? edge, InputSlot slot, bool isMost) => edge switch
    {
        null => "",
        { Value.Kind: ValueKind.Quantity } => ValueText.ShowBound(edge.Value.Number, slot.Unit!, isMost),
        _ => ValueText.Show(edge.Value, slot.Unit),
    };
}
