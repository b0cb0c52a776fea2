namespace Auditor.Reports.Comparisons;

/// <summary>A departure that came, went, or says something else.</summary>
/// <param name="State">What became of it: added, removed, changed.</param>
/// <param name="Rule">Rule id.</param>
/// <param name="Subject">Key of the subject.</param>
/// <param name="Before">What the earlier revision records; empty for nothing.</param>
/// <param name="After">What the later revision records; empty for nothing.</param>
/// <param name="Place">Where it stands.</param>
public sealed record ChangedDeparture(string State, string Rule, string Subject, string Before, string After, string Place);
