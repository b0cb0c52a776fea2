namespace Auditor.Engine.Evidence;

/// <summary>Makes sets of foundations, and each only once: most quantities of a design rest on one of a few.</summary>
internal sealed class FoundationSets
{
    private readonly Dictionary<Foundation, FoundationSet> _ofOne = [];
    private readonly Dictionary<(FoundationSet, FoundationSet), FoundationSet> _unions = [];
    private readonly Dictionary<string, FoundationSet> _byContent = new(StringComparer.Ordinal);
    private readonly Dictionary<Foundation, int> _numbers = [];

    /// <summary>The set of one foundation.</summary>
    public FoundationSet Of(Foundation foundation)
    {
        if (!_ofOne.TryGetValue(foundation, out var set))
        {
            _ofOne.Add(foundation, set = Of([foundation]));
        }

        return set;
    }

    /// <summary>What is in either of two sets.</summary>
    public FoundationSet Union(FoundationSet left, FoundationSet right)
    {
        if (left == right || right.Items.Count == 0)
        {
            return left;
        }

        if (left.Items.Count == 0)
        {
            return right;
        }

        if (!_unions.TryGetValue((left, right), out var union))
        {
            _unions.Add((left, right), union = Of([.. left.Items.Union(right.Items)]));
        }

        return union;
    }

    private FoundationSet Of(Foundation[] foundations)
    {
        var key = string.Join(' ', foundations.Select(NumberOf).Order());
        if (!_byContent.TryGetValue(key, out var set))
        {
            _byContent.Add(key, set = new FoundationSet(
                [.. foundations.OrderBy(item => item.Kind).ThenBy(item => item.Subject, StringComparer.Ordinal).ThenBy(item => item.Name, StringComparer.Ordinal)]));
        }

        return set;
    }

    private int NumberOf(Foundation foundation)
    {
        if (!_numbers.TryGetValue(foundation, out var number))
        {
            _numbers.Add(foundation, number = _numbers.Count);
        }

        return number;
    }
}
