using Auditor.Documents;

namespace Auditor.Reports.Schedules;

/// <summary>All wordings of the stage that reads the schedule of circuits.</summary>
internal static class ScheduleMessages
{
    public static Problem UnknownName(SourceSpan span, string name, string shape, string? nearest) => Problem.Warning(
        "unknown-symbol", $"this rule set knows nothing of a {shape} called `{name}`; the column is left out", span,
        nearest is null ? "name an input of the design or a symbol of a sheet, as formulas write them" : $"did you mean `{nearest}`?");

    public static Problem Linked(string path) => Problem.Error(
        "schedule-linked", $"`{path}` is a symbolic link", null, "put the schedule itself into the folder of the template");
}
