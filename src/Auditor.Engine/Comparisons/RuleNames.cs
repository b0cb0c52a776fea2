namespace Auditor.Engine.Comparisons;

/// <summary>Which rule of one revision is which of the other: by id, else by the former ids that either rule set declares.</summary>
internal sealed class RuleNames
{
    private readonly Dictionary<string, string> _after = new(StringComparer.Ordinal);
    private readonly Dictionary<string, string> _before = new(StringComparer.Ordinal);
    private readonly Dictionary<string, string> _formerly;

    public RuleNames(RevisionRules before, RevisionRules after)
    {
        var earlier = before.Rules.Select(rule => rule.Id).ToHashSet(StringComparer.Ordinal);
        var later = after.Rules.Select(rule => rule.Id).ToHashSet(StringComparer.Ordinal);
        var declared = after.Rules.Where(rule => !earlier.Contains(rule.Id)).SelectMany(rule => rule.Formerly.Select(former => (Before: former, After: rule.Id)))
            .Concat(before.Rules.Where(rule => !later.Contains(rule.Id)).SelectMany(rule => rule.Formerly.Select(former => (Before: rule.Id, After: former))))
            .Where(pair => earlier.Contains(pair.Before) && later.Contains(pair.After));
        foreach (var (one, other) in earlier.Where(later.Contains).Select(id => (Before: id, After: id)).Concat(declared))
        {
            if (!_after.ContainsKey(one) && _before.TryAdd(other, one))
            {
                _after.Add(one, other);
            }
        }

        _formerly = after.Rules.Concat(before.Rules).SelectMany(rule => rule.Formerly.Select(former => (former, rule.Id)))
            .DistinctBy(pair => pair.former).ToDictionary(pair => pair.former, pair => pair.Id, StringComparer.Ordinal);
    }

    /// <summary>Id in the later rule set of a rule of the earlier one; null where there is none.</summary>
    public string? AfterOf(string idBefore) => _after.GetValueOrDefault(idBefore);

    /// <summary>Id in the earlier rule set of a rule of the later one; null where there is none.</summary>
    public string? BeforeOf(string idAfter) => _before.GetValueOrDefault(idAfter);

    /// <summary>One name for a rule that a departure names by any of its ids.</summary>
    public string Settled(string id)
    {
        var present = _after.ContainsKey(id) || _before.ContainsKey(id) ? id : _formerly.GetValueOrDefault(id, id);
        return _after.GetValueOrDefault(present, present);
    }
}
