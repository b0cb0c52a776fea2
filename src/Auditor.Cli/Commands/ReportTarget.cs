using Auditor.Documents;
using Auditor.Engine.Comparisons;
using Auditor.Engine.Findings;
using Auditor.Engine.Registers;
using Auditor.Reports.Csv;
using Auditor.Reports.Comparisons;
using Auditor.Reports.Files;
using Auditor.Reports.Json;
using Auditor.Reports.JUnit;
using Auditor.Reports.Model;
using Auditor.Reports.Sarif;
using Auditor.Reports.Schedules;
using Auditor.Reports.Templates;

namespace Auditor.Cli.Commands;

/// <summary>A report to write: a path, in which <c>{name}</c> stands for the design's path without its ending, and a format.</summary>
/// <param name="Path">The path as given.</param>
/// <param name="Format">The format that its ending names.</param>
internal sealed record ReportTarget(string Path, ReportFormat Format)
{
    private const string Name = "{name}";

    /// <summary>The targets of a run, or null with problems added.</summary>
    public static IReadOnlyList<ReportTarget>? Read(IReadOnlyList<string> paths, int designs, Problems problems)
    {
        var targets = new List<ReportTarget>();
        foreach (var path in paths)
        {
            if (ReportFormat.Of(path, problems) is { } format)
            {
                targets.Add(new ReportTarget(path, format));
            }

            CheckName(path, designs, problems);
        }

        return problems.HasErrors ? null : targets;
    }

    /// <summary>Adds a problem when several designs would share one file.</summary>
    public static void CheckName(string path, int designs, Problems problems)
    {
        if (designs > 1 && !path.Contains(Name, StringComparison.Ordinal))
        {
            problems.Add(CommandMessages.ManyIntoOne(path));
        }
    }

    /// <summary>The path of a design's own file.</summary>
    public static string Named(string path, string design) => path.Replace(Name, DesignPaths.BaseName(design), StringComparison.Ordinal);

    /// <summary>Writes the report of an audit; false with problems added when it cannot be written.</summary>
    public bool Write(
        AuditResult result, RevisionComparison? against, Register register, string? template, FindingsOptions options, Problems problems)
    {
        var path = Named(Path, result.Design.File.Path);
        if (Format == ReportFormat.Json)
        {
            return ReportFile.Write(path, stream => FindingsJson.Write(result, register, options, stream), problems);
        }

        var bytes = Bytes(result, against, register, template, problems);
        return bytes is not null && ReportFile.Write(path, bytes, problems);
    }

    private byte[]? Bytes(
        AuditResult result, RevisionComparison? against, Register register, string? template, Problems problems)
    {
        if (Format == ReportFormat.Sarif)
        {
            return SarifReport.Write(result, against is null ? null : ComparisonReport.Baselines(against));
        }

        if (Format == ReportFormat.JUnit)
        {
            return JUnitReport.Write(result);
        }

        var own = template is null ? OfSet(result) : TemplateFile.At(template);
        return Format == ReportFormat.Csv
            ? Schedule.For(own, result.Rules, problems) is { } schedule ? CsvSchedule.Write(result, schedule) : null
            : Render(result, register, own ?? TemplateFile.Shipped(Format), problems);
    }

    /// <summary>The template that the rule set brings for this format; for the schedule alone, the one for Markdown, beside which it stands.</summary>
    private TemplateFile? OfSet(AuditResult result) =>
        result.Rules.Templates.TryGetValue(Format == ReportFormat.Csv ? ReportFormat.Markdown.Ending : Format.Ending, out var template)
            ? new TemplateFile(template.FullPath, template.DisplayPath)
            : null;

    private byte[]? Render(AuditResult result, Register register, TemplateFile template, Problems problems)
    {
        var schedule = Schedule.For(template, result.Rules, problems);
        return schedule is null ? null : TemplateReport.Render(ReportModel.Build(result, register, schedule), Format, template, problems);
    }
}
