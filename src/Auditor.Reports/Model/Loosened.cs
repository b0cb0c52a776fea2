using Auditor.Engine.HouseSets;
using Auditor.Engine.RuleSets;

namespace Auditor.Reports.Model;

/// <summary>What every report and every summary says of a house set that asks for less than the sets it is built on.</summary>
public static class Loosened
{
    /// <summary>All that is loosened, as one paragraph; empty where nothing is.</summary>
    public static string Text(RuleSet rules)
    {
        var changes = rules.Changes.Where(change => change.Loosens).ToArray();
        return changes.Length == 0
            ? ""
            : $"House rules ask for less than {rules.Title.BuiltOn}, or put their own in its place: {string.Join("; ", changes.Select(Said))}.";
    }

    private static string Said(HouseChange change) => $"{change.What.Word()} {change.Name} from {change.Before} to {change.After} ({change.How})";
}
