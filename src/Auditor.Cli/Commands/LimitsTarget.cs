using Auditor.Documents;
using Auditor.Engine.Limits;
using Auditor.Reports.Files;
using Auditor.Reports.Limits;
using Auditor.Reports.Templates;

namespace Auditor.Cli.Commands;

/// <summary>A file of limits to write; its ending names the format.</summary>
/// <param name="Path">The path as given.</param>
/// <param name="Ending">The ending.</param>
internal sealed record LimitsTarget(string Path, string Ending)
{
    private static readonly string[] Endings = [".md", ".csv", ".json"];

    /// <summary>The targets, with a problem added for each of no known format.</summary>
    public static IReadOnlyList<LimitsTarget> Read(IReadOnlyList<string> paths, Problems problems)
    {
        var targets = new List<LimitsTarget>();
        foreach (var path in paths)
        {
            if (Array.Find(Endings, ending => path.EndsWith(ending, StringComparison.OrdinalIgnoreCase)) is { } ending)
            {
                targets.Add(new LimitsTarget(path, ending));
            }
            else
            {
                problems.Add(CommandMessages.UnknownLimitsFormat(path, Endings));
            }
        }

        return targets;
    }

    /// <summary>Writes the file, with problems added when it cannot be written.</summary>
    public void Write(LimitResult result, Problems problems)
    {
        var bytes = Ending switch
        {
            ".csv" => LimitsCsv.Write(result),
            ".json" => LimitsJson.Write(result),
            _ => TemplateReport.Render(LimitsModel.Build(result), ReportFormat.Markdown, TemplateFile.ShippedLimits, problems),
        };
        if (bytes is not null)
        {
            ReportFile.Write(Path, bytes, problems);
        }
    }
}
