using System.Text;
using Auditor.Documents;
using Auditor.Reports.Files;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Tests;

/// <summary>Writes from a piece of a template.</summary>
internal static class Piece
{
    private const string Cut = "!cut!";

    /// <summary>Renders a template over a model with that title; the caution that every report has is cut off.</summary>
    public static string Write(ReportFormat format, string template, string title, TemporaryFolder folder)
    {
        var garden = Sheds.Model("garden");
        var model = garden with { Project = garden.Project with { Title = title } };
        var name = "t" + Path.GetExtension(format.TemplateName);
        var path = folder.Write(name, $"{template}\n{Cut}<p>{{{{ report.caution }}}}</p>");
        var problems = new Problems();
        var bytes = TemplateReport.Render(model, format, new TemplateFile(path, name), problems);
        Assert.Empty(problems.All);
        var text = Encoding.UTF8.GetString(bytes!);
        return text[..text.IndexOf(Cut, StringComparison.Ordinal)];
    }
}
