using Auditor.Reports.Comparisons;
using Spectre.Console;

namespace Auditor.Cli.Summaries;

/// <summary>Tells a comparison on a terminal: what is worse first, then what the design and the rule set changed.</summary>
/// <param name="console">The console.</param>
internal sealed class ComparisonSummary(IAnsiConsole console)
{
    private const int MostRows = 20;
    private const int MostCauses = 3;

    /// <summary>Writes the summary of a comparison.</summary>
    public void Write(ComparisonModel model)
    {
        console.MarkupLineInterpolated($"[bold]{model.Before.Name} → {model.After.Name}[/]");
        console.WriteLine(RuleSets(model));
        console.WriteLine();
        console.WriteLine(Counts(model));
        console.WriteLine();
        foreach (var group in model.Findings)
        {
            Findings(group);
        }

        Design(model);
        Departures(model.Departures);
        RuleData(model.RuleSet);
    }

    private static string RuleSets(ComparisonModel model) => model.RuleSet.IsSame
        ? $"rule set {RuleSet(model.After)}, the same in both"
        : $"rule set {RuleSet(model.Before)} → {RuleSet(model.After)}; their files differ";

    private static string RuleSet(ComparedRevision revision) =>
        revision.Edition.Length == 0 ? revision.RuleSet : $"{revision.RuleSet}, {revision.Edition}";

    private static string Counts(ComparisonModel model)
    {
        var told = model.Findings.Concat(model.Margins).Append(model.Unchanged).Select(group => $"{group.Findings.Count} {group.Kind}");
        return $"{model.NewOrWorse} {(model.NewOrWorse == 1 ? "finding" : "findings")} new or worse; {string.Join(", ", told)}";
    }

    private void Findings(ChangedFindings group)
    {
        console.MarkupLineInterpolated($"[bold]{group.Heading}: {group.Findings.Count}[/]");
        var table = Columns("finding", "before", "after", "moved by");
        foreach (var finding in group.Findings.Take(MostRows))
        {
            var causes = finding.Causes.Take(MostCauses).Append(finding.Causes.Count > MostCauses ? $"and {finding.Causes.Count - MostCauses} more" : "");
            table.AddRow(
                Markup.Escape(finding.Key), Markup.Escape(finding.Before.Text), Markup.Escape(finding.After.Text),
                Markup.Escape(string.Join('\n', causes.Prepend(finding.MovedBy).Where(line => line.Length > 0))));
        }

        Finish(table, group.Findings.Count);
    }

    private void Design(ComparisonModel model)
    {
        if (model.Subjects.Count > 0)
        {
            console.MarkupLineInterpolated($"[bold]Subjects that came, went, or stand elsewhere: {model.Subjects.Count}[/]");
            var table = Columns("subject", "before", "after", "known by");
            foreach (var subject in model.Subjects.Take(MostRows))
            {
                table.AddRow(Markup.Escape($"{subject.Kind} {subject.Name} {subject.State}"), Markup.Escape(subject.Before), Markup.Escape(subject.After), Markup.Escape(subject.By));
            }

            Finish(table, model.Subjects.Count);
        }

        if (model.Inputs.Count > 0)
        {
            console.MarkupLineInterpolated($"[bold]Changed inputs: {model.Inputs.Count}[/]");
            var table = Columns("of", "input", "before", "after", "where");
            foreach (var input in model.Inputs.Take(MostRows))
            {
                var more = input.Subjects.Count > 1 ? $" and {input.Subjects.Count - 1} more" : "";
                table.AddRow(
                    Markup.Escape(input.Subjects[0] + more), Markup.Escape(input.Path), Markup.Escape(input.Before), Markup.Escape(input.After),
                    Markup.Escape(input.PlaceAfter.Length > 0 ? input.PlaceAfter : input.PlaceBefore));
            }

            Finish(table, model.Inputs.Count);
        }
    }

    private void Departures(IReadOnlyList<ChangedDeparture> departures)
    {
        if (departures.Count == 0)
        {
            return;
        }

        console.MarkupLineInterpolated($"[bold]Departures that differ: {departures.Count}[/]");
        var table = Columns("of", "state", "before", "after");
        foreach (var departure in departures.Take(MostRows))
        {
            table.AddRow(
                Markup.Escape($"{departure.Rule}:{departure.Subject}"), Markup.Escape(departure.State), Markup.Escape(departure.Before), Markup.Escape(departure.After));
        }

        Finish(table, departures.Count);
    }

    private void RuleData(ChangedRuleSet changes)
    {
        if (changes.Changes.Count == 0)
        {
            return;
        }

        console.MarkupLineInterpolated($"[bold]Changed in the rule set: {changes.Changes.Count}[/]");
        var table = Columns("what", "state", "differs in");
        foreach (var change in changes.Changes.Take(MostRows))
        {
            var details = change.Details.Take(MostCauses).Select(detail => $"{detail.What}: {detail.Before} → {detail.After}")
                .Append(change.Details.Count > MostCauses ? $"and {change.Details.Count - MostCauses} more" : "");
            table.AddRow(
                Markup.Escape($"{change.Item} {change.Name}"), Markup.Escape(change.State), Markup.Escape(string.Join('\n', details.Where(line => line.Length > 0))));
        }

        Finish(table, changes.Changes.Count);
    }

    private void Finish(Table table, int rows)
    {
        console.Write(table);
        if (rows > MostRows)
        {
            console.WriteLine($"and {rows - MostRows} more; --write tells all");
        }

        console.WriteLine();
    }

    private static Table Columns(params string[] headings)
    {
        var table = new Table().Border(TableBorder.None).Expand();
        foreach (var heading in headings)
        {
            table.AddColumn(new TableColumn(heading) { Padding = new Padding(0, 0, 2, 0) });
        }

        return table;
    }
}
