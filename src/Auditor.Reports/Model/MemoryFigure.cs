namespace Auditor.Reports.Model;

/// <summary>A figure of the rule data that no publication at hand confirms.</summary>
/// <param name="Name">Table, curve or parameter.</param>
/// <param name="Text">The value as written; empty for a table or curve.</param>
/// <param name="Findings">Keys of the findings that rest on it.</param>
public sealed record MemoryFigure(string Name, string Text, IReadOnlyList<string> Findings);
