using System.Text;

namespace Auditor.Coverage;

/// <summary>Coverage as a table for a terminal.</summary>
internal static class Table
{
    /// <summary>One line for each tally and one for their total; percentages are rounded down, so that 100 % leaves out nothing.</summary>
    public static string Of(IReadOnlyList<Tally> tallies)
    {
        var total = new Tally(
            "total", tallies.Sum(tally => tally.LinesCovered), tallies.Sum(tally => tally.LinesMissed),
            tallies.Sum(tally => tally.BranchesCovered), tallies.Sum(tally => tally.BranchesMissed));
        var text = new StringBuilder($"{"coverage",-24}{"lines",16}{"branches",20}\n");
        foreach (var tally in tallies.Append(total))
        {
            text.Append($"{tally.Name,-24}{Share(tally.LinesCovered, tally.LinesMissed),16}{Share(tally.BranchesCovered, tally.BranchesMissed),20}\n");
        }

        return text.ToString();
    }

    private static string Share(int covered, int missed) =>
        covered + missed == 0 ? "none" : $"{Math.Floor(1000.0 * covered / (covered + missed)) / 10:0.0} % of {covered + missed,5}";
}
