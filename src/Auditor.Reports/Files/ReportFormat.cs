using Auditor.Documents;

namespace Auditor.Reports.Files;

/// <summary>A format of report, found by the ending of the file to write.</summary>
/// <param name="Ending">The ending, with its dot.</param>
/// <param name="TemplateName">File name of the shipped template; null for a format that is not written from one.</param>
public sealed record ReportFormat(string Ending, string? TemplateName)
{
    /// <summary>Plain text.</summary>
    public static ReportFormat Text { get; } = new(".txt", "report.scriban-txt");

    /// <summary>Markdown.</summary>
    public static ReportFormat Markdown { get; } = new(".md", "report.scriban-md");

    /// <summary>Findings for programs.</summary>
    public static ReportFormat Json { get; } = new(".json", null);

    /// <summary>All formats.</summary>
    public static IReadOnlyList<ReportFormat> All { get; } = [Text, Markdown, Json];

    /// <summary>The format of a file to write; null, with a problem that lists the known endings, when its ending is none of them.</summary>
    public static ReportFormat? Of(string path, Problems problems) =>
        All.FirstOrDefault(format => path.EndsWith(format.Ending, StringComparison.OrdinalIgnoreCase)) ?? Unknown(path, problems);

    private static ReportFormat? Unknown(string path, Problems problems)
    {
        problems.Add(FileMessages.UnknownEnding(path, All.Select(format => format.Ending)));
        return null;
    }
}
