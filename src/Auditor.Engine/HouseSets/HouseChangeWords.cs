namespace Auditor.Engine.HouseSets;

/// <summary>The words by which formulas and people know the kinds of change.</summary>
public static class HouseChangeWords
{
    /// <summary>All words.</summary>
    internal static IReadOnlyList<string> All { get; } = [.. Enum.GetValues<HouseChangeKind>().Select(Word)];

    /// <summary>The word for a kind.</summary>
    public static string Word(this HouseChangeKind kind) => kind switch
    {
        HouseChangeKind.Parameter => "parameter",
        HouseChangeKind.Provision => "provision",
        HouseChangeKind.Departures => "departures",
        HouseChangeKind.Rule => "rule",
        HouseChangeKind.Table => "table",
        HouseChangeKind.Curve => "curve",
        HouseChangeKind.Quantity => "quantity",
        _ => "edition",
    };
}
