namespace Auditor.Reports.Model;

/// <summary>An input that the design marks as assumed.</summary>
/// <param name="Subject">Key of the subject.</param>
/// <param name="Input">The input as the design file names it.</param>
/// <param name="Text">Its value as written.</param>
/// <param name="Location">Where it stands, as path:line:column.</param>
/// <param name="Findings">Keys of the findings that hang on it.</param>
public sealed record ReportAssumption(string Subject, string Input, string Text, string Location, IReadOnlyList<string> Findings);
