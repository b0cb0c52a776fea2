using Auditor.Documents;
using Auditor.Engine.Comparisons;
using Auditor.Engine.Findings;
using Auditor.Reports.Files;
using Auditor.Reports.Sarif;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Comparisons;

/// <summary>Writes reports of comparisons.</summary>
public static class ComparisonReport
{
    /// <summary>Formats that a comparison can be written in.</summary>
    public static IReadOnlyList<ReportFormat> Formats { get; } = [ReportFormat.Markdown, ReportFormat.Json, ReportFormat.Sarif];

    /// <summary>Writes a comparison in a format.</summary>
    /// <param name="comparison">The comparison.</param>
    /// <param name="format">One of <see cref="Formats"/>.</param>
    /// <param name="template">The template to use; null for the shipped one.</param>
    /// <param name="problems">Receives what is wrong with the template, or that the format needs an audit.</param>
    /// <returns>The report in UTF-8, lines ended by LF; null when there are problems.</returns>
    public static byte[]? Write(RevisionComparison comparison, ReportFormat format, TemplateFile? template, Problems problems)
    {
        if (format == ReportFormat.Json)
        {
            return ComparisonJson.Write(comparison);
        }

        if (format == ReportFormat.Markdown)
        {
            return TemplateReport.Render(ComparisonModel.Build(comparison), format, template ?? TemplateFile.ShippedAs("compare.scriban-md"), problems);
        }

        if (comparison.After.Audit is not { } audit)
        {
            problems.Add(FileMessages.NeedsAudit(format.Ending, comparison.After.Name));
            return null;
        }

        return SarifReport.Write(audit, Baselines(comparison));
    }

    /// <summary>How each finding of the later revision that was not conforming before stands against the earlier one, by key; the others are new.</summary>
    public static IReadOnlyDictionary<string, SarifBaseline> Baselines(RevisionComparison comparison) => comparison.Findings
        .Where(change => change is { After: not null, Before.Verdict: not Verdict.Conforms })
        .ToDictionary(
            change => change.After!.Key,
            change => change.Kind == FindingChangeKind.Unchanged ? SarifBaseline.Unchanged : SarifBaseline.Updated,
            StringComparer.Ordinal);
}
