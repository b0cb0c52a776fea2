namespace Auditor.Reports.Model;

/// <summary>A departure that the design records.</summary>
/// <param name="Rule">Rule id as the design writes it.</param>
/// <param name="Subject">Key of the subject.</param>
/// <param name="Reason">Why it is acceptable.</param>
/// <param name="AgreedBy">Who agreed.</param>
/// <param name="Date">When, as year-month-day.</param>
/// <param name="Until">Last day on which it holds; empty for no end.</param>
/// <param name="State">What became of it, in words.</param>
/// <param name="Location">Where it stands, as path:line:column.</param>
public sealed record ReportDeparture(
    string Rule, string Subject, string Reason, string AgreedBy, string Date, string Until, string State, string Location);
