using Auditor.Formulas.Tables;

namespace Auditor.Rules.Tests.Precise;

/// <summary>The cells of a lookup by their keys, read without the lookup's own search.</summary>
internal sealed class PreciseTable
{
    private readonly IReadOnlyList<LookupKey> _keys;
    private readonly Level _root = new();

    public PreciseTable(Lookup lookup)
    {
        _keys = lookup.Keys;
        foreach (var (keys, cell) in lookup.Cells())
        {
            var level = _root;
            foreach (var key in keys)
            {
                level = level.Open(key);
            }

            level.Cell = cell;
        }
    }

    /// <summary>The figure or the word for the keys; null where the table holds none.</summary>
    public object? Find(IReadOnlyList<object> keys) => Find(_root, keys, 0);

    /// <summary>The least key that is not below a number; null where there is none.</summary>
    public object? RoundUp(DoubleDouble number) => _root.Numbers.Keys.Where(key => Slack.AtLeast(key, number)).Select(key => (object?)(DoubleDouble)key).FirstOrDefault();

    private object? Find(Level level, IReadOnlyList<object> keys, int depth)
    {
        if (depth == keys.Count)
        {
            return level.Cell switch
            {
                null or { IsEmpty: true } => null,
                { Word: { } word } => word,
                { Number: var number } => (DoubleDouble)number,
            };
        }

        if (keys[depth] is string text)
        {
            return level.Words.TryGetValue(text, out var found) ? Find(found, keys, depth + 1) : null;
        }

        var sought = (DoubleDouble)keys[depth];
        var after = level.Numbers.Keys.TakeWhile(key => !Slack.AtLeast(key, sought)).Count();
        var above = after < level.Numbers.Count ? level.Numbers.Keys[after] : (double?)null;
        if (above is { } next && (_keys[depth].Between == Between.NextRow || Slack.Same(next, sought)))
        {
            return Find(level.Numbers[next], keys, depth + 1);
        }

        return above is not { } high || after == 0 || _keys[depth].Between == Between.None
            ? null
            : Interpolated(_keys[depth].Between, sought, (level.Numbers.Keys[after - 1], high), side => Find(level.Numbers[side], keys, depth + 1));
    }

    private static object? Interpolated(Between how, DoubleDouble sought, (double Low, double High) keys, Func<double, object?> find)
    {
        if (find(keys.Low) is not DoubleDouble low || find(keys.High) is not DoubleDouble high)
        {
            return null;
        }

        return how == Between.Linear
            ? low + ((sought - keys.Low) / ((DoubleDouble)keys.High - keys.Low) * (high - low))
            : low * (high / low).Power((sought / keys.Low).Log() / ((DoubleDouble)keys.High / keys.Low).Log());
    }

    private sealed class Level
    {
        public Dictionary<string, Level> Words { get; } = [];

        public SortedList<double, Level> Numbers { get; } = [];

        public TableCell? Cell { get; set; }

        public Level Open(object key)
        {
            var next = key is string word ? Words.GetValueOrDefault(word) : Numbers.GetValueOrDefault((double)key);
            if (next is null)
            {
                next = new Level();
                if (key is string name)
                {
                    Words.Add(name, next);
                }
                else
                {
                    Numbers.Add((double)key, next);
                }
            }

            return next;
        }
    }
}
