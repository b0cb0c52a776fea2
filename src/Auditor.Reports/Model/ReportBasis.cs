namespace Auditor.Reports.Model;

/// <summary>How the audit was made.</summary>
/// <param name="Design">File name of the design.</param>
/// <param name="Stage">Stage of the job as the design states it; "not stated" where it does not.</param>
/// <param name="Decision">How values were held against limits, in words.</param>
/// <param name="AsOf">The day on which departures were judged, as year-month-day; empty where it made no difference.</param>
public sealed record ReportBasis(string Design, string Stage, string Decision, string AsOf);
