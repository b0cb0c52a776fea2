using Auditor.Documents;
using Auditor.Reports.Files;
using Auditor.Reports.Model;

namespace Auditor.Reports.Templates;

/// <summary>Writes a report from a template.</summary>
public static class TemplateReport
{
    /// <summary>Writes a report.</summary>
    /// <param name="model">What to show.</param>
    /// <param name="format">Text or Markdown; decides how inserted text is made inert.</param>
    /// <param name="template">The template.</param>
    /// <param name="problems">Receives what is wrong with the template, with its path, line and column.</param>
    /// <returns>The report in UTF-8 without a byte order mark; null when there are problems.</returns>
    public static byte[]? Render(ReportModel model, ReportFormat format, TemplateFile template, Problems problems) =>
        throw new NotSupportedException($"{model.Project.Title} {format} {template} {problems.HasErrors}");
}
