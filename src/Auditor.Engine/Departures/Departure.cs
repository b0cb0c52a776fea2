using Auditor.Documents;

namespace Auditor.Engine.Departures;

/// <summary>A known nonconformity that a named person accepts for a stated reason, as the design records it.</summary>
/// <param name="Rule">Rule id, present or former.</param>
/// <param name="Subject">Key of the subject.</param>
/// <param name="Reason">Why it is acceptable.</param>
/// <param name="AgreedBy">Who agreed.</param>
/// <param name="Date">When, as year-month-day.</param>
/// <param name="Expires">Last day on which it holds; null for no end.</param>
/// <param name="State">What became of it.</param>
/// <param name="Span">Where it stands.</param>
public sealed record Departure(
    string Rule, string Subject, string Reason, string AgreedBy, DateOnly Date, DateOnly? Expires, DepartureState State, SourceSpan Span);
