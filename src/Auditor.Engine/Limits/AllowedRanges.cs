using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Limits;

/// <summary>Puts the bounds of several rules together.</summary>
internal static class AllowedRanges
{
    /// <summary>
    /// The stretches at which all rules are kept, ascending. Rules that the input cannot help, because they are kept at no value or cannot
    /// be judged at any, are left out.
    /// </summary>
    public static IReadOnlyList<AllowedRange> Of(IEnumerable<RuleLimit> rules)
    {
        List<AllowedRange> allowed = [new AllowedRange(null, null)];
        foreach (var rule in rules.Where(rule => rule.Kind is LimitKind.Limit or LimitKind.NotMonotone))
        {
            allowed = [.. allowed.SelectMany(range => rule.Kept.Select(kept => Both(range, kept, rule)).OfType<AllowedRange>())];
        }

        return allowed;
    }

    /// <summary>The stretch to speak of: the one that holds the stated value, else the nearest to it; the first where nothing is stated.</summary>
    public static AllowedRange? Around(IReadOnlyList<AllowedRange> allowed, double? stated) =>
        stated is { } position ? allowed.MinBy(range => range.Distance(position)) : allowed.Count > 0 ? allowed[0] : null;

    /// <summary>Whether a rule is a requirement.</summary>
    public static bool IsRequired(RuleLimit rule) => rule.At.Rule.Provision == Provision.Requirement;

    private static AllowedRange? Both(AllowedRange range, KeptRange kept, RuleLimit rule)
    {
        var least = kept.Least is { } from && (range.Least is null || from.Position > range.Least.Edge.Position) ? new LimitBound(from, rule) : range.Least;
        var most = kept.Most is { } to && (range.Most is null || to.Position < range.Most.Edge.Position) ? new LimitBound(to, rule) : range.Most;
        return least is not null && most is not null && least.Edge.Position > most.Edge.Position ? null : new AllowedRange(least, most);
    }
}
