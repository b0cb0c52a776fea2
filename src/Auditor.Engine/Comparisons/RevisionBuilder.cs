using System.Globalization;
using Auditor.Documents;
using Auditor.Engine.Departures;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Comparisons;

/// <summary>Takes from an audit what is compared.</summary>
internal sealed class RevisionBuilder(string name, AuditResult audit)
{
    private readonly DesignFile _file = audit.Design.File;

    public Revision Build() => new()
    {
        Name = name,
        Mark = _file.Root.Mapping("project")?.Text("revision") ?? "",
        Inputs = [.. _file.Inputs.Select(input => input with { Path = _file.Shown(input.Path) }).OrderBy(input => input.Path, StringComparer.Ordinal)],
        Rules = Rules(audit.Rules),
        Subjects = [.. audit.Subjects.Select(Of)],
        Findings = [.. audit.Findings.Select(Of)],
        Departures = [.. audit.Departures.Select(Of)],
        Audit = audit,
    };

    private static RevisionRules Rules(RuleSet rules) => new(
        rules.Title.Id, rules.Title.Text, rules.Title.Edition, rules.Title.Sha256,
        [.. rules.Parameters.Select(parameter => new RevisionParameter(
            parameter.Id, parameter.About, Figure.Of(parameter.Value, parameter.Slot.Unit)! with { Text = parameter.Text }))],
        [.. rules.AllRules.Select(rule => new RevisionRule(rule.Id, rule.Title, rule.Formerly))]);

    private RevisionSubject Of(DesignSubject subject) => new(subject.Key, subject.Shape.Name, subject.Node.Text("name"), subject.Parent?.Key)
    {
        Place = PlaceOf(subject.Place),
        Stated = [.. StatedInput.Of(subject).Select(input => new RevisionInput(
            input.Slot.Path, input.Text, input.From, input.Slot.Type.Kind, PlaceOf(input.Span)))],
        Source = subject,
    };

    private RevisionFinding Of(Finding finding)
    {
        var (check, judgement) = (finding.Rule.Check, finding.Judgement);
        var compares = check.How != CheckKind.Require;
        var limits = judgement.Limits.Select(limit => Figure.Of(limit, check.Unit)).OfType<Figure>().ToArray();
        return new RevisionFinding
        {
            Rule = finding.Rule.Id,
            Title = finding.Rule.Title,
            Subject = finding.Subject.Key,
            Verdict = finding.Verdict,
            OnAssumption = finding.OnAssumption,
            IsRequirement = finding.Rule.Provision == Provision.Requirement,
            Value = compares ? Figure.Of(judgement.Value, check.Unit) : null,
            Limits = limits.Length == judgement.Limits.Count ? limits : [],
            LimitShown = limits.Length == judgement.Limits.Count && limits.Length > 0 ? finding.LimitShown : "",
            RelativeMargin = judgement.Margin?.Relative,
            AbsoluteMargin = judgement.Margin?.Absolute,
            MarginShown = finding.MarginShown ?? "",
            Message = finding.Message,
            Missing = [.. (judgement.Absences?.Items ?? []).Select(absence => absence.Name).Distinct(StringComparer.Ordinal)],
            Place = PlaceOf(finding.Location),
        };
    }

    private RevisionDeparture Of(Departure departure) => new(
        departure.Rule, departure.Subject, departure.Reason, departure.AgreedBy, Day(departure.Date),
        departure.Until is { } last ? Day(last) : null, departure.State, PlaceOf(departure.Span));

    private Place PlaceOf(SourceSpan span)
    {
        var at = span.StartLocation;
        return new Place(_file.Shown(span.Source.Path), at.Line, at.Column);
    }

    private static string Day(DateOnly day) => day.ToString("yyyy-MM-dd", CultureInfo.InvariantCulture);
}
