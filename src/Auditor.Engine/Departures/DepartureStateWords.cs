namespace Auditor.Engine.Departures;

/// <summary>The words by which formulas know what became of a departure.</summary>
internal static class DepartureStateWords
{
    /// <summary>All words.</summary>
    public static IReadOnlyList<string> All { get; } = [.. Enum.GetValues<DepartureState>().Select(Word)];

    /// <summary>The word for a state.</summary>
    public static string Word(this DepartureState state) => state switch
    {
        DepartureState.InForce => "in force",
        DepartureState.NotNeeded => "not needed",
        DepartureState.Expired => "expired",
        DepartureState.Forbidden => "forbidden",
        _ => "unmatched",
    };
}
