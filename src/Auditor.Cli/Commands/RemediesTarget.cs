using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Engine.Remedies;
using Auditor.Reports.Files;
using Auditor.Reports.Remedies;
using Auditor.Reports.Templates;

namespace Auditor.Cli.Commands;

/// <summary>A file of remedies to write; its ending names the format.</summary>
/// <param name="Path">The path as given.</param>
/// <param name="Ending">The ending.</param>
internal sealed record RemediesTarget(string Path, string Ending)
{
    private const string Patch = ".patch";
    private static readonly string[] Endings = [".md", ".json", Patch];

    /// <summary>Whether it holds one remedy, to be applied.</summary>
    public bool IsPatch => Ending == Patch;

    /// <summary>The targets, with a problem added for each of no known format.</summary>
    public static IReadOnlyList<RemediesTarget> Read(IReadOnlyList<string> paths, Problems problems)
    {
        var targets = new List<RemediesTarget>();
        foreach (var path in paths)
        {
            if (Array.Find(Endings, ending => path.EndsWith(ending, StringComparison.OrdinalIgnoreCase)) is { } ending)
            {
                targets.Add(new RemediesTarget(path, ending));
            }
            else
            {
                problems.Add(CommandMessages.UnknownRemediesFormat(path, Endings));
            }
        }

        return targets;
    }

    /// <summary>Writes the file, with problems added when it cannot be written.</summary>
    /// <param name="result">The remedies.</param>
    /// <param name="chosen">The remedy of a patch.</param>
    /// <param name="problems">Receives what is wrong.</param>
    public void Write(RemedyResult result, Remedy? chosen, Problems problems)
    {
        var bytes = Ending switch
        {
            Patch => RemedyPatch.Write(result.Audit.Design, chosen!, path => FromHere(result.Audit.Design.File, path)),
            ".json" => RemediesJson.Write(result),
            _ => TemplateReport.Render(RemediesModel.Build(result), ReportFormat.Markdown, TemplateFile.ShippedRemedies, problems),
        };
        if (bytes is not null)
        {
            ReportFile.Write(Path, bytes, problems);
        }
    }

    /// <summary>A path from the current folder, where the patch is to be applied; from the folder of the design where that lies elsewhere.</summary>
    private static string FromHere(DesignFile file, string path)
    {
        var here = System.IO.Path.GetRelativePath(Environment.CurrentDirectory, System.IO.Path.GetFullPath(path)).Replace('\\', '/');
        return here.StartsWith("../", StringComparison.Ordinal) ? file.Shown(path) : here;
    }
}
