using System.Globalization;
using Auditor.Engine.Findings;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.Comparisons;

/// <summary>Tells which figures of the tables and curves of two rule sets differ.</summary>
internal static class FigureComparer
{
    private static readonly Unit Ampere = UnitCatalog.Find("A")!;
    private static readonly Unit Second = UnitCatalog.Find("s")!;

    public static IEnumerable<RuleChange> Compare(FormulaWorld before, FormulaWorld after) =>
        Lookups(before, after).Concat(Tables(before, after)).Concat(Curves(before.Curves, after.Curves));

    /// <summary>The cells that differ, each with its namesake, and the name of the change that tells of them.</summary>
    public static IEnumerable<(TableCell? One, TableCell? Other, string Table)> ChangedCells(FormulaWorld before, FormulaWorld after) =>
        Cells(before, after).Where(cell => !IsSame(cell.One, cell.Other)).Select(cell => (cell.One, cell.Other, TableOf(cell)));

    private static IEnumerable<RuleChange> Lookups(FormulaWorld before, FormulaWorld after)
    {
        foreach (var (one, other) in RuleSetComparer.Joined(before.Lookups.Values, after.Lookups.Values, lookup => lookup.Name))
        {
            var (said, says) = (one is null ? "" : Keys(one), other is null ? "" : Keys(other));
            if (said != says)
            {
                yield return new RuleChange(
                    RuleItem.Lookup, (other ?? one)!.Name, (other ?? one)!.About, one is null, other is null,
                    one is null || other is null ? [] : [new RuleDetail("keys", said, says)]);
            }
        }
    }

    private static string Keys(Lookup lookup) =>
        string.Join(", ", lookup.Keys.Select(key => $"{key.Name} {key.Unit?.Symbol ?? "word"} {key.Between}")) + $" gives {lookup.Unit?.Symbol ?? "word"}";

    private static IEnumerable<RuleChange> Tables(FormulaWorld before, FormulaWorld after)
    {
        foreach (var table in Cells(before, after).ToLookup(TableOf, StringComparer.Ordinal))
        {
            var changed = table.Where(cell => !IsSame(cell.One, cell.Other)).ToArray();
            if (changed.Length > 0)
            {
                yield return new RuleChange(
                    RuleItem.Table, table.Key, (changed[0].Other ?? changed[0].One)!.Table.Title,
                    table.All(cell => cell.One is null), table.All(cell => cell.Other is null), [.. changed.Select(cell => Detail(cell.One, cell.Other, cell.Unit))]);
            }
        }
    }

    /// <summary>A cell belongs to the table that holds it in the later rule set, else to the one that held it.</summary>
    private static string TableOf((TableCell? One, TableCell? Other, Unit? Unit) cell) => (cell.Other ?? cell.One)!.Table.Id;

    private static IEnumerable<(TableCell? One, TableCell? Other, Unit? Unit)> Cells(FormulaWorld before, FormulaWorld after)
    {
        foreach (var (one, other) in RuleSetComparer.Joined(before.Lookups.Values, after.Lookups.Values, lookup => lookup.Name))
        {
            var (earlier, later) = (Cells(one), Cells(other));
            foreach (var key in earlier.Keys.Union(later.Keys, StringComparer.Ordinal))
            {
                yield return (earlier.GetValueOrDefault(key), later.GetValueOrDefault(key), (other ?? one)!.Unit);
            }
        }
    }

    private static Dictionary<string, TableCell> Cells(Lookup? lookup) => lookup is null
        ? []
        : lookup.Cells().ToDictionary(cell => string.Join('\n', cell.Keys.Select(Key)), cell => cell.Cell, StringComparer.Ordinal);

    private static string Key(object key) => key is double number ? number.ToString("R", CultureInfo.InvariantCulture) : (string)key;

    private static bool IsSame(TableCell? one, TableCell? other) =>
        one is not null && other is not null && one.Word == other.Word
        && ((double.IsNaN(one.Number) && double.IsNaN(other.Number)) || Comparison.Same(one.Number, other.Number));

    private static RuleDetail Detail(TableCell? one, TableCell? other, Unit? unit)
    {
        var cell = (other ?? one)!;
        return new RuleDetail(cell.Column.Length == 0 ? $"row {cell.Row}" : $"row {cell.Row}, column {cell.Column}", Text(one, unit), Text(other, unit));
    }

    private static string Text(TableCell? cell, Unit? unit) => cell switch
    {
        null => "",
        { IsEmpty: true } => "no figure",
        _ => cell.Word ?? ValueText.ShowNumber(cell.Number, unit ?? Unit.One),
    };

    private static IEnumerable<RuleChange> Curves(CurveSet before, CurveSet after)
    {
        foreach (var (one, other) in RuleSetComparer.Joined(InForce(before), InForce(after), curve => curve.Source.Id))
        {
            var details = RuleSetComparer.Joined(one is null ? [] : Lines(one), other is null ? [] : Lines(other), line => line.What)
                .Where(pair => pair.One?.Exact != pair.Other?.Exact)
                .Select(pair => new RuleDetail((pair.Other ?? pair.One)!.What, pair.One?.Text ?? "", pair.Other?.Text ?? "")).ToArray();
            if (details.Length > 0)
            {
                yield return new RuleChange(RuleItem.Curve, (other ?? one)!.Source.Id, (other ?? one)!.Source.Title, one is null, other is null, details);
            }
        }
    }

    /// <summary>A later set's curve stands before an earlier one's of the same name, and is the one that is read.</summary>
    private static IEnumerable<Curve> InForce(CurveSet curves) => curves.All.DistinctBy(curve => curve.Source.Id);

    private static IEnumerable<Line> Lines(Curve curve)
    {
        var devices = $"{string.Join(", ", curve.Standards)} {curve.Type ?? "any type"}";
        return curve.Slow.Select(edge => Of("slow edge", curve, edge)).Concat(curve.Fast.Select(edge => Of("fast edge", curve, edge)))
            .DistinctBy(line => line.What).Append(new Line("devices", devices, devices));
    }

    private static Line Of(string which, Curve curve, CurveEdge edge)
    {
        var unit = curve.ByRating ? Unit.One : Ampere;
        return new Line(
            $"{which}, {ValueText.ShowNumber(edge.Rating, Ampere)}",
            string.Join(", ", edge.Points.Select(point => $"{ValueText.ShowNumber(point.Current, unit)} for {ValueText.ShowNumber(point.Time, Second)}")),
            string.Join(' ', edge.Points.Select(point => string.Create(CultureInfo.InvariantCulture, $"{point.Current:R}/{point.Time:R}"))));
    }

    private sealed record Line(string What, string Text, string Exact);
}
