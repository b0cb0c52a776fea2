namespace Auditor.Reports.Model;

/// <summary>One circuit of the schedule.</summary>
/// <param name="Key">Key of the circuit.</param>
/// <param name="Name">Its name; empty where it has none.</param>
/// <param name="Cells">One text for each heading; empty where nothing is said.</param>
/// <param name="Verdict">The gravest verdict of the circuit and its legs; empty where no rule applied.</param>
/// <param name="Margin">The least relative margin of the circuit and its legs; empty where nothing was measured.</param>
/// <param name="MarginRule">The rule that has it; empty where nothing was measured.</param>
/// <param name="WorstMargin">The least relative margin that they can have within the tolerances; empty where no tolerance makes a difference.</param>
public sealed record ScheduleRow(
    string Key, string Name, IReadOnlyList<string> Cells, string Verdict, string Margin, string MarginRule, string WorstMargin);
