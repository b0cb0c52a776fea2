using System.Globalization;
using Auditor.Documents;
using Auditor.Formulas.Types;

namespace Auditor.Cli.Importing;

/// <summary>
/// Makes the tree of a design file from a circuit list. Each value keeps the place of its cell, so that whatever the schema or the tree
/// of supplies has against it is told there.
/// </summary>
/// <param name="list">The circuit list.</param>
internal sealed class ImportedDesign(CircuitList list)
{
    private const char BetweenWords = ';';

    /// <summary>Makes the root of the design file.</summary>
    /// <param name="supply">What the list does not say: the entries of <c>supply</c>.</param>
    public MappingNode Make(IReadOnlyList<MappingEntry> supply)
    {
        var whole = list.Table.Source.WholeSpan().Slice(0, 0);
        var fed = list.Table.Rows.Select(row => list.Cell(row, CircuitColumn.Feeds)?.Text).OfType<string>().ToHashSet();
        var boards = list.Table.Rows.GroupBy(row => list.Identifier(row, CircuitColumn.Board).Text);
        return new MappingNode(whole,
        [
            Entry("design-format", new ScalarNode(whole, "1", ScalarKind.Number, 1)),
            Entry("supply", new MappingNode(supply[0].Value.Span, supply)),
            Entry("boards", new SequenceNode(whole, [.. boards.Select(rows => Board([.. rows], fed))])),
        ]);
    }

    /// <summary>A scalar as the design file would have it: a number or flag where one is due and the text is one, else the text.</summary>
    public static ScalarNode Scalar(string text, SourceSpan span, FormulaType type, bool isIdentifier)
    {
        if (type.Kind == FormulaKind.Flag && (text.Equals("true", StringComparison.OrdinalIgnoreCase) || text.Equals("false", StringComparison.OrdinalIgnoreCase)))
        {
            return new ScalarNode(span, text.ToLowerInvariant(), ScalarKind.Flag);
        }

        var mayBeNumber = isIdentifier ? text.All(char.IsAsciiDigit) && text[0] != '0' : type.Kind == FormulaKind.Quantity && type.Dimension.IsNone;
        return mayBeNumber && double.TryParse(text, NumberStyles.AllowDecimalPoint | NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture, out var number)
            ? new ScalarNode(span, text, ScalarKind.Number, number)
            : new ScalarNode(span, text, ScalarKind.Text);
    }

    private static MappingEntry Entry(string key, Node value) => new(new Located<string>(key, value.Span), value);

    private MappingNode Board(IReadOnlyList<IReadOnlyList<CsvCell>> rows, HashSet<string> fed)
    {
        var name = list.Identifier(rows[0], CircuitColumn.Board);
        var feed = fed.Contains(name.Text) ? null : Entry("fed-from", new ScalarNode(name.Span, "origin", ScalarKind.Text));
        MappingEntry?[] entries = [Entry("id", Identifier(name)), feed, Entry("circuits", new SequenceNode(name.Span, [.. rows.Select(Circuit)]))];
        return new MappingNode(name.Span, [.. entries.OfType<MappingEntry>()]);
    }

    private MappingNode Circuit(IReadOnlyList<CsvCell> row)
    {
        var values = list.Said(row).Where(pair => pair.Column.Name is not (CircuitColumn.Board or CircuitColumn.Id))
            .DistinctBy(pair => pair.Column)
            .Select(pair => (pair.Column.Keys, Value(pair.Column, pair.Cell)));
        return Mapping(row[0].Span, [([CircuitColumn.Id], Identifier(list.Identifier(row, CircuitColumn.Id))), .. values], 0);
    }

    private static ScalarNode Identifier(CsvCell cell) => Scalar(cell.Text, cell.Span, FormulaType.Text, isIdentifier: true);

    private static Node Value(CircuitColumn column, CsvCell cell)
    {
        if (column.Type.Kind != FormulaKind.Words)
        {
            return Scalar(cell.Text, cell.Span, column.Type, column.IsIdentifier);
        }

        return new SequenceNode(cell.Span, [.. Words(cell).Where(word => word.Text.Length > 0)]);
    }

    private static IEnumerable<ScalarNode> Words(CsvCell cell)
    {
        // A cell with doubled quotes reads otherwise than it stands; its words are then told at the cell.
        var isAsWritten = cell.Span.Text == cell.Text;
        var at = 0;
        foreach (var part in cell.Text.Split(BetweenWords))
        {
            var word = part.Trim();
            var span = isAsWritten ? cell.Span.Slice(at + part.IndexOf(word, StringComparison.Ordinal), word.Length) : cell.Span;
            yield return new ScalarNode(span, word, ScalarKind.Text);
            at += part.Length + 1;
        }
    }

    private static MappingNode Mapping(SourceSpan span, IReadOnlyList<(IReadOnlyList<string> Keys, Node Value)> values, int depth) =>
        new(span, [.. values.GroupBy(value => value.Keys[depth]).Select(group =>
        {
            var first = group.First();
            return Entry(group.Key, first.Keys.Count == depth + 1 ? first.Value : Mapping(first.Value.Span, [.. group], depth + 1));
        })]);
}
