using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Registers;
using Auditor.Reports.Files;
using Auditor.Reports.Json;
using Auditor.Reports.Model;
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
        var bytes = Format.TemplateName is null
            ? FindingsJson.Write(result, register, options)
            : Render(result, register, template is null ? TemplateFile.Shipped(Format) : TemplateFile.At(template), problems);
        var path = Path.Replace(Name, DesignPaths.BaseName(result.Design.File.Path), StringComparison.Ordinal);
        return bytes is not null && ReportFile.Write(path, bytes, problems);
    }

    private byte[]? Render(AuditResult result, Register register, TemplateFile template, Problems problems)
    {
        var schedule = Schedule.For(template, result.Rules, problems);
        return schedule is null ? null : TemplateReport.Render(ReportModel.Build(result, register, schedule), Format, template, problems);
    }
}
