using Auditor.Formulas.Values;

namespace Auditor.Formulas.Tables;

/// <summary>One level of a lookup's key tree.</summary>
internal sealed class LookupLevel
{
    private readonly Dictionary<KeyValue, LookupLevel> _next = [];
    private KeyValue[] _ordered = [];

    /// <summary>The cell, at the last level.</summary>
    public TableCell? Cell { get; set; }

    public LookupLevel Open(KeyValue key)
    {
        if (!_next.TryGetValue(key, out var level))
        {
            level = new LookupLevel();
            _next.Add(key, level);
        }

        return level;
    }

    public LookupLevel? At(KeyValue key) => _next.GetValueOrDefault(key);

    /// <summary>The tabulated number that is the given one within the slack of comparisons, so that a size that was computed finds its row.</summary>
    public LookupLevel? At(double number)
    {
        if (At(KeyValue.Of(number)) is { } exact)
        {
            return exact;
        }

        return NextUp(number) is { } next && Comparison.Same(next.Number, number) ? At(next) : null;
    }

    /// <summary>The tabulated numbers that lead to a figure, ascending.</summary>
    public IEnumerable<double> Numbers() => _ordered.Where(key => _next[key].Cell is { IsEmpty: false }).Select(key => key.Number);

    public void Close()
    {
        _ordered = [.. _next.Keys.Where(key => key.Word is null).OrderBy(key => key.Number)];
        foreach (var level in _next.Values)
        {
            level.Close();
        }
    }

    /// <summary>The least tabulated number not below the given one, or null.</summary>
    public KeyValue? NextUp(double number)
    {
        foreach (var key in _ordered)
        {
            if (Comparison.AtLeast(key.Number, number))
            {
                return key;
            }
        }

        return null;
    }

    /// <summary>The greatest tabulated number below the given one, or null.</summary>
    public KeyValue? NextDown(double number)
    {
        for (var i = _ordered.Length - 1; i >= 0; i--)
        {
            if (!Comparison.AtLeast(_ordered[i].Number, number))
            {
                return _ordered[i];
            }
        }

        return null;
    }

    public IEnumerable<(IReadOnlyList<object> Keys, TableCell Cell)> Cells(IReadOnlyList<object> path)
    {
        if (Cell is not null)
        {
            yield return (path, Cell);
        }

        foreach (var (key, level) in _next.OrderBy(pair => pair.Key.Word, StringComparer.Ordinal).ThenBy(pair => pair.Key.Number))
        {
            object part = key.Word is null ? key.Number : key.Word;
            foreach (var cell in level.Cells([.. path, part]))
            {
                yield return cell;
            }
        }
    }

    /// <summary>The words tabulated at this level.</summary>
    public IEnumerable<string> Words() => _next.Keys.Where(key => key.Word is not null).Select(key => key.Word!).Order(StringComparer.Ordinal);
}
