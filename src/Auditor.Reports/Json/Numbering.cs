namespace Auditor.Reports.Json;

/// <summary>Numbers things from 0 in the order in which they are met.</summary>
/// <typeparam name="T">The things; equal ones have one number.</typeparam>
internal sealed class Numbering<T>
    where T : notnull
{
    private readonly Dictionary<T, int> _numbers = [];
    private readonly List<T> _all = [];

    /// <summary>The things met so far, by number.</summary>
    public IReadOnlyList<T> All => _all;

    /// <summary>The number of a thing.</summary>
    public int Of(T thing)
    {
        if (_numbers.TryAdd(thing, _all.Count))
        {
            _all.Add(thing);
        }

        return _numbers[thing];
    }
}
