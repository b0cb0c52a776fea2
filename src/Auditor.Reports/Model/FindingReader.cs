using Auditor.Engine.Departures;
using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Pictures;
using Auditor.Reports.Reading;
using Auditor.Reports.Remedies;

namespace Auditor.Reports.Model;

/// <summary>Turns findings into what reports show of them.</summary>
internal sealed class FindingReader(
    AuditResult result, Places places, Supports supports, IReadOnlyDictionary<Departure, ReportDeparture> departures, Lazy<WorkingsBuilder> workings)
{
    private readonly FormulaLines _formulas = new(result.Rules);

    public ReportFinding Read(Finding finding)
    {
        var rule = finding.Rule;
        var relative = finding.Judgement.Margin?.Relative is { } share ? ValueText.ShowMargin(share) : "";
        var absolute = finding.MarginShown ?? "";
        return new ReportFinding
        {
            Key = finding.Key,
            Rule = rule.Id,
            Title = rule.Title,
            Subject = finding.Subject.Key,
            SubjectLabel = SubjectText.Label(finding.Subject),
            Verdict = finding.VerdictText,
            VerdictWord = finding.Verdict.Word(),
            Anchor = Anchor.Of(finding.Key),
            Board = SubjectText.BoardOf(finding.Subject)?.Key ?? "",
            IsRequirement = rule.Provision == Provision.Requirement,
            ClauseType = rule.Clause.Type,
            References = rule.Clause.References,
            ClauseNote = rule.Clause.Note,
            Value = finding.ValueShown,
            Limit = finding.LimitShown,
            Margin = relative.Length == 0 ? absolute : $"{relative} ({absolute})",
            RelativeMargin = relative,
            AbsoluteMargin = absolute,
            WorstMargin = finding.WorstCase?.Margin?.Relative is { } worst ? ValueText.ShowMargin(worst) : "",
            WithinTolerances = ToleranceLines.Of(finding),
            MarginSteps = finding.Judgement.Margin?.Relative is { } distance ? (int)Math.Round(Math.Clamp(distance, -1, 1) * 20) : 0,
            Sentence = finding.Message,
            Why = rule.Why,
            PutRightBy = rule.PutRightBy,
            Remedy = result.Remedies?.Of(finding.Key) is { } remedies ? RemedyText.Nearest(remedies) : "",
            Location = places.Text(finding.Location),
            RestsOn = [.. supports.Of(finding).Select(Shown)],
            Formulas = _formulas.Of(finding),
            Missing = [.. finding.Judgement.Absences?.Items.Select(absence => absence.ToString()) ?? []],
            Departure = finding.Departure is { } departure ? departures[departure] : null,
            Unfolding = new Lazy<ReportDerivation?>(() => workings.Value.Of(finding)),
        };
    }

    private string Shown(Foundation foundation)
    {
        if (foundation.Kind == FoundationKind.AssumedInput)
        {
            return $"an assumed input, {foundation.Subject} {foundation.Name}: {foundation.Text} ({places.Text(foundation.Span!.Value)})";
        }

        return "a figure from memory, " + (foundation.Text.Length == 0 ? foundation.Name : $"{foundation.Name}: {foundation.Text}");
    }
}
