using Auditor.Documents;

namespace Auditor.Formulas.Tables;

/// <summary>Which keys of a lookup a table fixes as a whole, which run down its rows and which across its columns.</summary>
internal sealed class TableLayout
{
    private readonly Lookup _lookup;
    private readonly object?[] _fixed;

    private TableLayout(Lookup lookup, object?[] fixedKeys, IReadOnlyList<int> down, IReadOnlyList<Column> columns)
    {
        _lookup = lookup;
        _fixed = fixedKeys;
        Down = down;
        Columns = columns;
    }

    /// <summary>Key numbers that run down, in the order of a row.</summary>
    public IReadOnlyList<int> Down { get; }

    /// <summary>The columns.</summary>
    public IReadOnlyList<Column> Columns { get; }

    /// <summary>The layout of a table, or null with problems added.</summary>
    public static TableLayout? Of(MappingNode file, Lookup lookup, Problems problems)
    {
        var before = problems.All.Count;
        var fixedKeys = new object?[lookup.Keys.Count];
        var seen = new int[lookup.Keys.Count];
        foreach (var entry in file.Mapping("where")?.Entries ?? [])
        {
            if (KeyNumber(lookup, entry.Key.Value, entry.Key.Span, seen, problems) is { } number)
            {
                fixedKeys[number] = KeyOf(lookup.Keys[number], (ScalarNode)entry.Value, problems);
            }
        }

        var down = Numbers(file, "down", lookup, seen, problems);
        var across = Numbers(file, "across", lookup, seen, problems);
        foreach (var key in lookup.Keys.Where((_, i) => seen[i] != 1))
        {
            problems.Add(TableMessages.KeyNotOnce(file.Find("table")!.Span, key.Name));
        }

        if (file.Find("columns") is null != file.Find("across") is null)
        {
            problems.Add(TableMessages.ColumnsOrAcross((file.Find("columns") ?? file.Find("across"))!.Span));
        }

        var columns = across.Count == 0 ? [new Column("", [])] : ColumnsOf(file, lookup, across, problems);
        return problems.All.Count == before ? new TableLayout(lookup, fixedKeys, down, columns) : null;
    }

    /// <summary>The key values of one cell, in the order of the lookup; null with a problem where a key is not a number.</summary>
    public object[]? PathOf(IReadOnlyList<ScalarNode> rowKeys, int column, Problems problems)
    {
        var path = (object?[])_fixed.Clone();
        for (var i = 0; i < Down.Count; i++)
        {
            path[Down[i]] = KeyOf(_lookup.Keys[Down[i]], rowKeys[i], problems);
        }

        foreach (var (number, value) in Columns[column].Keys)
        {
            path[number] = value;
        }

        return Array.Exists(path, part => part is null) ? null : (object[])path!;
    }

    private static List<Column> ColumnsOf(MappingNode file, Lookup lookup, List<int> across, Problems problems)
    {
        var columns = new List<Column>();
        foreach (var node in file.Items("columns"))
        {
            ScalarNode[] parts = node is SequenceNode list ? [.. list.Items.OfType<ScalarNode>()] : [(ScalarNode)node];
            if (parts.Length != across.Count)
            {
                problems.Add(TableMessages.ColumnKeys(node.Span, across.Count, parts.Length));
                continue;
            }

            var keys = parts.Select((part, i) => (across[i], KeyOf(lookup.Keys[across[i]], part, problems) ?? "")).ToArray();
            columns.Add(new Column(string.Join(", ", parts.Select(part => part.Text)), keys));
        }

        return columns;
    }

    private static List<int> Numbers(MappingNode file, string where, Lookup lookup, int[] seen, Problems problems)
    {
        var numbers = new List<int>();
        foreach (var scalar in file.Items(where).OfType<ScalarNode>())
        {
            if (KeyNumber(lookup, scalar.Text, scalar.Span, seen, problems) is { } number)
            {
                numbers.Add(number);
            }
        }

        return numbers;
    }

    private static int? KeyNumber(Lookup lookup, string name, SourceSpan span, int[] seen, Problems problems)
    {
        for (var i = 0; i < lookup.Keys.Count; i++)
        {
            if (lookup.Keys[i].Name == name)
            {
                seen[i]++;
                return i;
            }
        }

        problems.Add(TableMessages.UnknownKey(span, lookup.Name, name, lookup.Keys.Select(key => key.Name)));
        return null;
    }

    private static object? KeyOf(LookupKey key, ScalarNode scalar, Problems problems)
    {
        if (scalar.Kind == ScalarKind.Null)
        {
            problems.Add(TableMessages.NoKey(scalar.Span));
            return null;
        }

        if (key.Unit is null)
        {
            return scalar.Text;
        }

        if (scalar.Kind == ScalarKind.Number)
        {
            return key.Unit.ToCoherent(scalar.Number);
        }

        problems.Add(TableMessages.NotNumber(scalar.Span, key.Unit.Symbol));
        return null;
    }

    /// <summary>A column: its heading, and the keys that it fixes.</summary>
    internal sealed record Column(string Title, IReadOnlyList<(int Key, object Value)> Keys);
}
