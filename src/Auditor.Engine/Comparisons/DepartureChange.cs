namespace Auditor.Engine.Comparisons;

/// <summary>A departure that came, went, or is worded, dated or judged otherwise.</summary>
/// <param name="Before">The departure in the earlier revision; null for one that was added.</param>
/// <param name="After">The departure in the later revision; null for one that was removed.</param>
public sealed record DepartureChange(RevisionDeparture? Before, RevisionDeparture? After);
