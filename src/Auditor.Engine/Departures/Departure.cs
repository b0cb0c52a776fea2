using Auditor.Documents;

namespace Auditor.Engine.Departures;

/// <summary>A known nonconformity that a named person accepts for a stated reason, as the design records it.</summary>
/// <param name="Rule">Rule id, present or former.</param>
/// <param name="Subject">Key of the subject, or a pattern of keys in which <c>*</c> stands for any characters.</param>
/// <param name="Reason">Why it is acceptable.</param>
/// <param name="AgreedBy">Who agreed.</param>
/// <param name="Date">When, as year-month-day.</param>
/// <param name="Until">Last day on which it holds; null for no end.</param>
/// <param name="State">What became of it.</param>
/// <param name="Node">Its mapping.</param>
public sealed record Departure(
    string Rule, string Subject, string Reason, string AgreedBy, DateOnly Date, DateOnly? Until, DepartureState State, MappingNode Node)
{
    /// <summary>Where it stands: at the rule that it names.</summary>
    public SourceSpan Span => Node.Find("rule")!.Span;
}
