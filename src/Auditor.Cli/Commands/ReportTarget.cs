using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Registers;
using Auditor.Reports.Csv;
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

            if (designs > 1 && !path.Contains(Name, StringComparison.Ordinal))
            {
                problems.Add(CommandMessages.ManyIntoOne(path));
            }
        }

        return problems.HasErrors ? null : targets;
    }

    /// <summary>Writes the report of an audit; false with problems added when it cannot be written.</summary>
    public bool Write(AuditResult result, Register register, string? template, FindingsOptions options, Problems problems)
    {
        var bytes = Bytes(result, register, template, options, problems);
        var path = Path.Replace(Name, DesignPaths.BaseName(result.Design.File.Path), StringComparison.Ordinal);
        return bytes is not null && ReportFile.Write(path, bytes, problems);
    }

    private byte[]? Bytes(AuditResult result, Register register, string? template, FindingsOptions options, Problems problems)
    {
        if (Format == ReportFormat.Json)
        {
            return FindingsJson.Write(result, register, options);
        }

        if (Format == ReportFormat.Sarif)
        {
            return SarifReport.Write(result);
        }

        if (Format == ReportFormat.JUnit)
        {
            return JUnitReport.Write(result);
        }

        var own = template is null ? null : TemplateFile.At(template);
        return Format == ReportFormat.Csv
            ? Schedule.For(own, result.Rules, problems) is { } schedule ? CsvSchedule.Write(result, schedule) : null
            : Render(result, register, own ?? TemplateFile.Shipped(Format), problems);
    }

    private byte[]? Render(AuditResult result, Register register, TemplateFile template, Problems problems)
    {
        var schedule = Schedule.For(template, result.Rules, problems);
        return schedule is null ? null : TemplateReport.Render(ReportModel.Build(result, register, schedule), Format, template, problems);
    }
}
