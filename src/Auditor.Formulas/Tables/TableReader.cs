using Auditor.Documents;

namespace Auditor.Formulas.Tables;

/// <summary>Enters the figures of table files that their schema has accepted into their lookups.</summary>
public sealed class TableReader(IReadOnlyDictionary<string, Lookup> lookups, Problems problems)
{
    private readonly Dictionary<string, (string Path, int Set)> _tables = [];
    private readonly Dictionary<TableSource, int> _setOf = new(ReferenceEqualityComparer.Instance);
    private readonly List<LaterCell> _later = [];

    /// <summary>What any set but the first entered, in its order.</summary>
    public IReadOnlyList<LaterCell> Later => _later;

    /// <summary>Enters one table.</summary>
    /// <param name="file">Root of the file.</param>
    /// <param name="set">Number of its set in the chain: the cells of a later set go before those of an earlier one; within a set a cell stands once.</param>
    public void Read(MappingNode file, int set)
    {
        var id = file.Scalar("table")!;
        var path = file.Span.Source.Path;
        if (_tables.TryGetValue(id.Text, out var other) && other.Set == set)
        {
            problems.Add(TableMessages.SecondTable(id.Span, id.Text, other.Path));
            return;
        }

        _tables[id.Text] = (path, set);
        var name = file.Scalar("lookup")!;
        if (!lookups.TryGetValue(name.Text, out var lookup))
        {
            problems.Add(TableMessages.UnknownLookup(name.Span, name.Text, NearestWord.Find(name.Text, lookups.Keys)));
            return;
        }

        var layout = TableLayout.Of(file, lookup, problems);
        if (layout is not null)
        {
            var source = new TableSource(id.Text, file.Text("title")!, file.Texts("source"), path);
            _setOf.Add(source, set);
            Enter(file, lookup, layout, source);
        }
    }

    private void Enter(MappingNode file, Lookup lookup, TableLayout layout, TableSource source)
    {
        var trust = TrustWords.Find(file.Text("trust")!)!.Value;
        var rowTrust = file.Mapping("row-trust");
        foreach (var row in file.Items("rows").OfType<SequenceNode>())
        {
            var wanted = layout.Down.Count + layout.Columns.Count;
            if (row.Items.Count != wanted)
            {
                problems.Add(TableMessages.RowLength(row.Span, wanted, row.Items.Count));
                continue;
            }

            var keys = row.Items.Take(layout.Down.Count).OfType<ScalarNode>().ToArray();
            var ownTrust = rowTrust?.Text(keys[0].Text) is { } word ? TrustWords.Find(word)!.Value : trust;
            var line = row.Span.StartLocation.Line;
            for (var i = 0; i < layout.Columns.Count; i++)
            {
                var place = new CellPlace(source, string.Join(", ", keys.Select(key => key.Text)), layout.Columns[i].Title, ownTrust, line);
                EnterCell(lookup, layout.PathOf(keys, i, problems), (ScalarNode)row.Items[layout.Down.Count + i], place);
            }
        }
    }

    private void EnterCell(Lookup lookup, object[]? path, ScalarNode scalar, CellPlace place)
    {
        if (path is null || CellOf(lookup, scalar, place) is not { } cell)
        {
            return;
        }

        var set = _setOf[place.Table];
        var before = lookup.Enter(path, cell);
        if (set > 0)
        {
            _later.Add(new LaterCell(lookup, before, cell, set, scalar.Span));
        }

        if (before is not null && _setOf[before.Table] == set)
        {
            problems.Add(TableMessages.SecondCell(
                scalar.Span, place.Column.Length == 0 ? place.Row : $"{place.Row} / {place.Column}", $"{before.Table.Path}:{before.Line}"));
        }
    }

    private TableCell? CellOf(Lookup lookup, ScalarNode scalar, CellPlace place)
    {
        if (scalar.Kind == ScalarKind.Null)
        {
            return new TableCell(place.Table, place.Row, place.Column, double.NaN, null, place.Trust, place.Line);
        }

        if (lookup.Unit is not { } unit)
        {
            return new TableCell(place.Table, place.Row, place.Column, double.NaN, scalar.Text, place.Trust, place.Line);
        }

        if (scalar.Kind == ScalarKind.Number)
        {
            return new TableCell(place.Table, place.Row, place.Column, unit.ToCoherent(scalar.Number), null, place.Trust, place.Line);
        }

        problems.Add(TableMessages.NotNumber(scalar.Span, unit.Symbol));
        return null;
    }

    private sealed record CellPlace(TableSource Table, string Row, string Column, Trust Trust, int Line);
}
