using Auditor.Documents;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Files;

/// <summary>A format of report, found by the ending of the file to write.</summary>
public sealed class ReportFormat
{
    private ReportFormat(string ending, string? templateName, Ink? ink)
    {
        Ending = ending;
        TemplateName = templateName;
        Ink = ink;
    }

    /// <summary>Plain text.</summary>
    public static ReportFormat Text { get; } = new(".txt", "report.scriban-txt", new PlainInk());

    /// <summary>Markdown.</summary>
    public static ReportFormat Markdown { get; } = new(".md", "report.scriban-md", new MarkdownInk());

    /// <summary>A page that stands alone, for screen and paper.</summary>
    public static ReportFormat Html { get; } = new(".html", "report.scriban-html", new HtmlInk());

    /// <summary>Findings for programs.</summary>
    public static ReportFormat Json { get; } = new(".json", null, null);

    /// <summary>Results for code review: SARIF 2.1.0.</summary>
    public static ReportFormat Sarif { get; } = new(".sarif", null, null);

    /// <summary>Test results: JUnit XML.</summary>
    public static ReportFormat JUnit { get; } = new(".xml", null, null);

    /// <summary>The schedule of circuits for spreadsheets.</summary>
    public static ReportFormat Csv { get; } = new(".csv", null, null);

    /// <summary>All formats.</summary>
    public static IReadOnlyList<ReportFormat> All { get; } = [Text, Markdown, Html, Json, Sarif, JUnit, Csv];

    /// <summary>The ending, with its dot.</summary>
    public string Ending { get; }

    /// <summary>File name of the shipped template; null for a format that is not written from one.</summary>
    public string? TemplateName { get; }

    internal Ink? Ink { get; }

    /// <summary>The format of a file to write; null, with a problem that lists the known endings, when its ending is none of them.</summary>
    public static ReportFormat? Of(string path, Problems problems) => Of(path, All, problems);

    /// <summary>The format of a file to write, of those that come into question; null, with a problem that lists their endings, when its ending is none of them.</summary>
    public static ReportFormat? Of(string path, IReadOnlyList<ReportFormat> formats, Problems problems)
    {
        var format = formats.FirstOrDefault(format => path.EndsWith(format.Ending, StringComparison.OrdinalIgnoreCase));
        if (format is null)
        {
            problems.Add(FileMessages.UnknownEnding(path, formats.Select(known => known.Ending)));
        }

        return format;
    }
}
