using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Model;
using Spectre.Console;

namespace Auditor.Cli.Summaries;

/// <summary>Tells one audit on a terminal: counts, what needs action first, what is missing, what rests on assumptions.</summary>
/// <param name="console">The console.</param>
internal sealed class Summary(IAnsiConsole console)
{
    private const int MostSubjects = 6;

    /// <summary>Writes the summary of a design.</summary>
    public void Write(AuditResult result)
    {
        var title = result.Rules.Title;
        console.MarkupLineInterpolated($"[bold]{result.Design.File.Path}[/]");
        console.WriteLine($"rule set {title.Id}, {title.Edition}");
        if (title.Notice.Length > 0)
        {
            console.WriteLine(title.Notice);
        }

        if (Loosened.Text(result.Rules) is { Length: > 0 } loosened)
        {
            console.MarkupLineInterpolated($"[bold]{loosened}[/]");
        }

        console.WriteLine();
        console.WriteLine(Counts(result));
        console.WriteLine();
        List(result, Verdict.Nonconforming, Provision.Requirement, "Requirements not met, to be put right");
        List(result, Verdict.Unproven, Provision.Requirement, "Requirements met as stated, but not everywhere within the tolerances");
        Gaps(result);
        List(result, Verdict.Nonconforming, Provision.Recommendation, "Recommendations not followed");
        List(result, Verdict.Unproven, Provision.Recommendation, "Recommendations followed as stated, but not everywhere within the tolerances");
    }

    private static string Counts(AuditResult result)
    {
        var assumed = result.Findings.Count(finding => finding.Verdict == Verdict.Conforms && finding.OnAssumption);
        return $"{result.Findings.Count} findings on {result.Subjects.Count} subjects: {result.Count(Verdict.Nonconforming)} nonconforming, " +
            (result.Decision == Decision.Guarded ? $"{result.Count(Verdict.Unproven)} unproven, " : "") +
            $"{result.Count(Verdict.Undetermined)} undetermined, {result.Count(Verdict.Departed)} departed, {result.Count(Verdict.Conforms)} conforming ({assumed} on an assumption)";
    }

    private void List(AuditResult result, Verdict verdict, Provision provision, string heading)
    {
        var findings = result.Findings.Where(finding => finding.Verdict == verdict && finding.Rule.Provision == provision).ToArray();
        if (findings.Length == 0)
        {
            return;
        }

        console.MarkupLineInterpolated($"[bold]{heading}: {findings.Length}[/]");
        var table = Columns("subject", "finding", "margin", "where");
        foreach (var finding in findings)
        {
            table.AddRow(
                Markup.Escape(finding.Subject.Key), Markup.Escape($"{finding.Message} [{finding.Rule.Id}]"),
                Markup.Escape(Margin(finding)), Markup.Escape(Place(finding)));
        }

        console.Write(table);
        console.WriteLine();
    }

    private static string Margin(Finding finding)
    {
        var stated = finding.Judgement.Margin?.Relative is { } margin ? ValueText.ShowMargin(margin) : "";
        return finding.Verdict == Verdict.Unproven && finding.WorstCase!.Margin?.Relative is { } worst ? $"{stated}, worst {ValueText.ShowMargin(worst)}" : stated;
    }

    private static string Place(Finding finding)
    {
        var at = finding.Location.StartLocation;
        return $"{Path.GetFileName(finding.Location.Source.Path)}:{at.Line}:{at.Column}";
    }

    private void Gaps(AuditResult result)
    {
        var gaps = Gap.Of(result);
        if (gaps.Count == 0)
        {
            return;
        }

        console.MarkupLineInterpolated($"[bold]Missing, so that requirements cannot be judged: {gaps.Count}[/]");
        var table = Columns("what", "of", "findings");
        foreach (var gap in gaps)
        {
            var more = gap.Subjects.Count > MostSubjects ? $" and {gap.Subjects.Count - MostSubjects} more" : "";
            var what = gap.Help.Length == 0 ? gap.Why : $"{gap.Why}; {gap.Help}";
            table.AddRow(Markup.Escape(what), Markup.Escape(string.Join(", ", gap.Subjects.Take(MostSubjects)) + more), $"{gap.Findings}");
        }

        console.Write(table);
        console.WriteLine();
    }

    private static Table Columns(params string[] headings)
    {
        var table = new Table().Border(TableBorder.None).Expand();
        foreach (var heading in headings)
        {
            table.AddColumn(new TableColumn(heading) { Padding = new Padding(0, 0, 2, 0), NoWrap = heading is "margin" or "where" or "findings" });
        }

        return table;
    }
}
