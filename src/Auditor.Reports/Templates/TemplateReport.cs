using System.Text;
using Auditor.Documents;
using Auditor.Reports.Files;
using Auditor.Reports.Limits;
using Auditor.Reports.Model;
using Scriban.Syntax;

namespace Auditor.Reports.Templates;

/// <summary>
/// Writes a report from a template in the Scriban language. A template reaches the model as <c>report</c>, the functions
/// <c>array.*</c> and <c>string.*</c>, <c>code</c> (a text set as code), <c>prose</c> (a sentence whose backquotes set off code) and
/// <c>include</c> (a file in the folder of the template), and nothing else: no file, no environment, no clock.
/// Whatever it inserts is made inert; only its own fixed text is markup.
/// </summary>
public static class TemplateReport
{
    /// <summary>Writes a report.</summary>
    /// <param name="model">What to show: texts, flags, whole numbers and lists of such, with their members documented.</param>
    /// <param name="format">Text or Markdown; decides how inserted text is made inert.</param>
    /// <param name="template">The template.</param>
    /// <param name="problems">Receives what is wrong with the template, with its path, line and column.</param>
    /// <param name="limits">How much the template may ask for; null for the default limits.</param>
    /// <returns>The report in UTF-8 without a byte order mark, lines ended by LF; null when there are problems.</returns>
    /// <exception cref="ArgumentException">The format is not written from a template.</exception>
    public static byte[]? Render(object model, ReportFormat format, TemplateFile template, Problems problems, TemplateLimits? limits = null)
    {
        var ink = format.Ink ?? throw new ArgumentException($"no template writes {format.Ending}", nameof(format));
        var folder = new TemplateFolder(template, limits ?? TemplateLimits.Default, problems);
        if (folder.ParseTop() is not { } parsed)
        {
            return null;
        }

        var context = new ReportContext(model, LoosenedOf(model), ink, folder);
        try
        {
            var text = ink.Finish(parsed.Render(context).Replace("\r\n", "\n", StringComparison.Ordinal));
            if (!context.HasShownCaution)
            {
                return folder.Refuse(TemplateMessages.WithoutCaution);
            }

            return context.HasShownLoosened ? Encoding.UTF8.GetBytes(text) : folder.Refuse(TemplateMessages.WithoutLoosened);
        }
        catch (ScriptRuntimeException fault)
        {
            return folder.Refuse(fault);
        }
    }

    private static string LoosenedOf(object model) => model switch
    {
        ReportModel report => report.RuleSet.Loosened,
        LimitsModel limits => limits.RuleSet.Loosened,
        _ => "",
    };
}
