using Auditor.Documents;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Engine.HouseSets;

/// <summary>Finds the figures of tables and the curves of the sets below that a house set replaces, or comes between.</summary>
internal static class HouseRuleData
{
    /// <summary>Adds the changes to tables, one for each pair of tables.</summary>
    /// <param name="cells">What sets built on others entered.</param>
    /// <param name="setOf">Number of the set that declares a lookup.</param>
    /// <param name="changes">Receives the changes.</param>
    public static void Tables(IEnumerable<LaterCell> cells, IReadOnlyDictionary<string, int> setOf, HouseChanges changes)
    {
        var all = cells.ToArray();
        foreach (var group in all.Where(IsReplaced).GroupBy(cell => (cell.Set, Before: cell.Before!.Table, After: cell.Cell.Table)))
        {
            changes.Add(
                group.Key.Set, HouseChangeKind.Table, group.Key.Before.Id, (group.Key.Before.Path, group.Key.After.Path), loosens: true,
                $"{Figures(group.Count())} replaced", group.First().Span);
        }

        var between = all.Where(cell => cell.Before is null && setOf[cell.Lookup.Name] < cell.Set && MovesNeighbours(cell.Lookup));
        foreach (var group in between.GroupBy(cell => (cell.Set, cell.Lookup.Name, After: cell.Cell.Table)))
        {
            changes.Add(
                group.Key.Set, HouseChangeKind.Table, group.Key.Name, ("its own figures", group.Key.After.Path), loosens: true,
                $"{Figures(group.Count())} put between or beside those that it reads between or rounds up to", group.First().Span);
        }
    }

    /// <summary>Adds the curves that go before others for the same devices.</summary>
    /// <param name="curves">All curves.</param>
    /// <param name="places">Where each curve file names its curve, by path.</param>
    /// <param name="changes">Receives the changes.</param>
    public static void Curves(CurveSet curves, IReadOnlyDictionary<string, SourceSpan> places, HouseChanges changes)
    {
        foreach (var (later, earlier, set) in curves.Hidden())
        {
            changes.Add(
                set, HouseChangeKind.Curve, earlier.Source.Id, (earlier.Source.Path, later.Source.Path), loosens: true, "replaced",
                places[later.Source.Path]);
        }
    }

    private static bool IsReplaced(LaterCell cell) => cell.Before is { IsEmpty: false } before
        && (before.Word != cell.Cell.Word || before.Trust != cell.Cell.Trust || !(cell.Cell.Word is not null || Comparison.Same(before.Number, cell.Cell.Number)));

    /// <summary>Whether a new row can change what the lookup gives for keys that no table holds.</summary>
    private static bool MovesNeighbours(Lookup lookup) =>
        lookup.Keys.Any(key => key.Between != Between.None) || lookup.Keys is [{ Unit: not null }];

    private static string Figures(int count) => count == 1 ? "1 figure" : $"{count} figures";
}
