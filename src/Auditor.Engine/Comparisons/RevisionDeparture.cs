using Auditor.Engine.Departures;

namespace Auditor.Engine.Comparisons;

/// <summary>A departure that one revision records.</summary>
/// <param name="Rule">Rule id, present or former.</param>
/// <param name="Subject">Key of the subject.</param>
/// <param name="Reason">Why it is acceptable.</param>
/// <param name="AgreedBy">Who agreed.</param>
/// <param name="Date">When, as year-month-day.</param>
/// <param name="Until">Last day on which it holds, as year-month-day; null for no end.</param>
/// <param name="State">What became of it.</param>
/// <param name="Place">Where it stands; null where a findings file does not tell.</param>
public sealed record RevisionDeparture(
    string Rule, string Subject, string Reason, string AgreedBy, string Date, string? Until, DepartureState State, Place? Place);
