using Auditor.Documents;

namespace Auditor.Formulas.Tables;

/// <summary>All wordings of the stage that reads lookups, tables and curves.</summary>
internal static class TableMessages
{
    public static Problem UnknownUnit(SourceSpan span, string unit) => Problem.Error(
        "unknown-unit", $"`{unit}` is not a unit", span, "write a unit such as A, mm², mΩ/m, or \"1\" for a pure number");

    public static Problem SecondLookup(SourceSpan span, string name) => Problem.Error(
        "duplicate-lookup", $"there is a lookup `{name}` already", span, "add a table to it instead, or choose another name");

    public static Problem SecondTable(SourceSpan span, string id, string otherPath) => Problem.Error(
        "duplicate-table", $"the name `{id}` is taken by {otherPath}", span, "give each table a name of its own");

    public static Problem UnknownLookup(SourceSpan span, string name, string? nearest) => Problem.Error(
        "unknown-lookup", $"there is no lookup `{name}`", span, nearest is null ? "add its lookup.yaml" : $"did you mean `{nearest}`?");

    public static Problem UnknownKey(SourceSpan span, string lookup, string key, IEnumerable<string> keys) => Problem.Error(
        "unknown-table-key", $"{lookup} has no key `{key}`", span, "its keys: " + string.Join(", ", keys));

    public static Problem KeyNotOnce(SourceSpan span, string key) => Problem.Error(
        "table-key-not-once", $"key `{key}` must be fixed by exactly one of `where`, `down` and `across`", span, null);

    public static Problem SecondBetween(SourceSpan span) => Problem.Error(
        "between-twice", "only one key may have anything between its rows", span, "leave the others at `none`");

    public static Problem BetweenWords(SourceSpan span, string what) => Problem.Error(
        "between-words", $"nothing lies between {what}", span, "only numbers have something between them; leave it at `none`");

    public static Problem ColumnsOrAcross(SourceSpan span) => Problem.Error(
        "columns-without-across", "`columns` and `across` belong together", span, "`across` names the keys, `columns` gives their values");

    public static Problem RowLength(SourceSpan span, int wanted, int got) => Problem.Error(
        "table-row-length", $"this row has {got} values, and {wanted} are due", span, "a row holds its keys, then one value for each column; write null for an empty cell");

    public static Problem ColumnKeys(SourceSpan span, int wanted, int got) => Problem.Error(
        "table-column-keys", $"this column has {got} key values, and `across` names {wanted}", span, "head each column by one value for each key across");

    public static Problem NoKey(SourceSpan span) => Problem.Error("table-no-key", "a row or column without a key stands for nothing", span, "write its key");

    public static Problem NotNumber(SourceSpan span, string unit) => Problem.Error(
        "table-not-a-number", unit == "1" ? "a number is due here" : $"a number in {unit} is due here", span, "tables hold bare numbers in the unit of their lookup");

    public static Problem NotPositive(SourceSpan span) => Problem.Error(
        "curve-not-positive", "currents and times of a curve are greater than zero", span, null);

    public static Problem SecondCell(SourceSpan span, string keys, string other) => Problem.Error(
        "duplicate-cell", $"the figure for {keys} is given a second time", span, $"it stands already in {other}; a house set may override a table, a set may not contradict itself");

    public static Problem NoRating(SourceSpan span, string key) => Problem.Error(
        "curve-rating", $"these points need `{key}`, and nothing else, to say what they hold for", span,
        "curves in multiples of the rating say `ratings-up-to`, curves in amperes `rating`");

    public static Problem SecondRating(SourceSpan span) => Problem.Error("curve-rating-twice", "there are points for this rating already", span, null);

    public static Problem SecondCurve(SourceSpan span, string id, string other) => Problem.Error(
        "duplicate-curve", $"curve `{id}` holds for devices that {other} holds for", span, "a house set may replace a curve, a set may not contradict itself");

    public static Problem CurveOrder(SourceSpan span) => Problem.Error(
        "curve-order", "along a curve the current grows and the time falls", span, "order the points by current; a step has the same current twice");
}
