using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Tables;

/// <summary>
/// A table function: figures by a fixed list of keys, gathered from one or more tables. Exact on words and on numbers,
/// unless a key says what holds between its tabulated values.
/// </summary>
/// <param name="name">Name by which formulas call it.</param>
/// <param name="about">What it gives, for people.</param>
/// <param name="keys">Its keys, in the order of the call.</param>
/// <param name="unit">Unit of its figures; null when it gives words.</param>
/// <param name="whenMissing">What to give instead of a missing figure.</param>
public sealed class Lookup(string name, string about, IReadOnlyList<LookupKey> keys, Unit? unit, string whenMissing)
{
    private readonly LookupLevel _root = new();

    /// <summary>Name by which formulas call it.</summary>
    public string Name { get; } = name;

    /// <summary>What it gives.</summary>
    public string About { get; } = about;

    /// <summary>Its keys.</summary>
    public IReadOnlyList<LookupKey> Keys { get; } = keys;

    /// <summary>Unit of its figures; null when it gives words.</summary>
    public Unit? Unit { get; } = unit;

    /// <summary>What to give instead of a missing figure.</summary>
    public string WhenMissing { get; } = whenMissing;

    /// <summary>Enters a cell; a cell already there gives way, as when a house set overrides a table.</summary>
    /// <param name="path">One value per key: a <see cref="double"/> in coherent units or a word.</param>
    /// <param name="cell">The cell.</param>
    /// <returns>The cell that was there before, or null.</returns>
    public TableCell? Enter(IReadOnlyList<object> path, TableCell cell)
    {
        var level = _root;
        foreach (var part in path)
        {
            level = level.Open(part is string word ? KeyValue.Of(word) : KeyValue.Of((double)part));
        }

        var before = level.Cell;
        level.Cell = cell;
        return before;
    }

    /// <summary>Orders the tabulated numbers; to be called once, after the last cell.</summary>
    public void Close() => _root.Close();

    /// <summary>The figure for the given keys.</summary>
    /// <param name="arguments">One value per key, none of them missing.</param>
    /// <param name="cells">Receives the cells used, where somebody records; null otherwise.</param>
    /// <returns>The figure or word; missing when the table does not hold it.</returns>
    public Value Find(ReadOnlySpan<Value> arguments, ICollection<TableCell>? cells)
    {
        var reading = new LookupReading(this, cells);
        return reading.Read(_root, arguments, 0);
    }

    /// <summary>
    /// The least tabulated value of the only key that is not below <paramref name="number"/>, in coherent units, with its cell; null when there is none.
    /// </summary>
    public (double Key, TableCell Cell)? RoundUp(double number) =>
        _root.NextUp(number) is { } next && _root.At(next)?.Cell is { } cell ? (next.Number, cell) : null;

    /// <summary>The series that the last key runs through: its tabulated numbers in coherent units, ascending, where the keys before it are as given.</summary>
    /// <param name="before">One value for each key but the last, none of them missing.</param>
    /// <returns>The numbers; none where nothing is tabulated for those keys.</returns>
    public IReadOnlyList<double> Series(IReadOnlyList<Value> before)
    {
        var level = _root;
        foreach (var key in before)
        {
            var next = key.Kind == ValueKind.Text ? level.At(KeyValue.Of(key.Text)) : level.At(key.Number);
            if (next is null)
            {
                return [];
            }

            level = next;
        }

        return [.. level.Numbers()];
    }

    /// <summary>All cells, in the order of their keys.</summary>
    public IEnumerable<(IReadOnlyList<object> Keys, TableCell Cell)> Cells() => _root.Cells([]);
}
