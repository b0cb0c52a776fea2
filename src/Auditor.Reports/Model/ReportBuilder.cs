using Auditor.Engine.Departures;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Registers;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Tables;
using Auditor.Reports.Reading;
using Auditor.Reports.Schedules;

namespace Auditor.Reports.Model;

/// <summary>Builds the model of an audit.</summary>
internal sealed class ReportBuilder
{
    private readonly AuditResult _result;
    private readonly Register _register;
    private readonly Schedule _schedule;
    private readonly Places _places;
    private readonly Supports _supports;
    private readonly Dictionary<Departure, ReportDeparture> _departures;

    public ReportBuilder(AuditResult result, Register register, Schedule schedule)
    {
        _result = result;
        _register = register;
        _schedule = schedule;
        _places = new Places(result.Design.File);
        _supports = new Supports(result);
        _departures = new Dictionary<Departure, ReportDeparture>(ReferenceEqualityComparer.Instance);
        foreach (var departure in result.Departures)
        {
            _departures.Add(departure, Of(departure));
        }
    }

    public ReportModel Build()
    {
        var workings = new Lazy<WorkingsBuilder>(() => Invariantly.Make(() => new WorkingsBuilder(_result, _places)));
        var reader = new FindingReader(_result, _places, _supports, _departures, workings);
        var findings = _result.Findings.Select(finding => (Finding: finding, finding.Verdict, Shown: reader.Read(finding))).ToArray();
        return new ReportModel
        {
            Project = Project(),
            Basis = Basis(),
            RuleSet = RuleSet(),
            Inputs = _places.Inputs,
            Counts = [.. VerdictOrder.GravestFirst.Where(verdict => verdict != Verdict.Unproven || _result.Decision == Decision.Guarded).Select(Count)],
            Action = [.. findings.Where(pair => pair.Verdict == Verdict.Nonconforming && pair.Shown.IsRequirement).Select(pair => pair.Shown)],
            Groups = [.. VerdictOrder.GravestFirst
                .Select(verdict => new FindingGroup(verdict.Word(), [.. findings.Where(pair => pair.Verdict == verdict).Select(pair => pair.Shown)]))
                .Where(group => group.Findings.Count > 0)],
            MakeRules = new(() => RuleGrouping.Of(findings.Select(pair => (pair.Finding, pair.Shown)))),
            MakeWorkings = new(() => Invariantly.Make(workings.Value.All)),
            ClauseTypes = [.. findings.Select(pair => pair.Shown.ClauseType).Distinct().Order(StringComparer.Ordinal)],
            Boards = [.. _result.Design.Subjects.Where(subject => subject.Shape.Name == "board")
                .Select(board => new ReportBoard(board.Key, SubjectText.Label(board)))],
            Schedule = new ScheduleFiller(_result, _schedule).Fill(),
            Missing = MissingThings.Of(_result),
            Departures = [.. _result.Departures.Select(departure => _departures[departure])],
            Assumptions = [.. _supports.Assumed.Select(Of)],
            MemoryFigures = [.. _supports.Memory.Select(figure => new MemoryFigure(figure.Name, figure.Text, figure.Findings))],
            Parameters = [.. _result.Rules.Parameters.Select(Of)],
            NotApplied = [.. _result.NotApplied.Select(rule => new ReportRule(rule.Id, rule.Title, rule.Clause.References))],
            NotCovered = NotCovered(),
        };
    }

    private ReportProject Project()
    {
        var said = ProjectWords.Of(_result.Design);
        return new ReportProject(said("title") ?? "", said("reference") ?? "", said("revision") ?? "", said("designer") ?? "", said("checker") ?? "");
    }

    private ReportBasis Basis() => new(
        _places.Design, AuditBasis.StageOf(_result.Design) ?? "not stated", AuditBasis.Sentence(_result.Decision),
        _result.AsOf is { } day ? DayText.Of(day) : "");

    private ReportRuleSet RuleSet()
    {
        var title = _result.Rules.Title;
        return new ReportRuleSet(title.Id, title.Text, title.Edition, title.Notice, title.Chain, title.Sha256, _result.Rules.Rules.Count, Loosened.Text(_result.Rules));
    }

    private VerdictCount Count(Verdict verdict)
    {
        var all = _result.Findings.Where(finding => finding.Verdict == verdict).ToArray();
        var requirements = all.Count(finding => finding.Rule.Provision == Provision.Requirement);
        return new VerdictCount(verdict.Word(), requirements, all.Length - requirements, all.Length, all.Count(finding => finding.OnAssumption));
    }

    private ReportDeparture Of(Departure departure) => new(
        departure.Rule, departure.Subject, departure.Reason, departure.AgreedBy, DayText.Of(departure.Date),
        departure.Until is { } day ? DayText.Of(day) : "", StateText(departure.State), _places.Text(departure.Span));

    private ReportAssumption Of(Supports.AssumedInput assumed) => new(
        assumed.Input.Subject.Key, assumed.Input.Slot.Path, assumed.Input.Text, _places.Text(assumed.Input.Span), assumed.Findings);

    private static ReportParameter Of(Parameter parameter) => new(
        parameter.Id, parameter.Text, parameter.About, parameter.Clause, parameter.Source, parameter.Trust?.Word() ?? "", parameter.Span.Source.Path);

    private static string StateText(DepartureState state) => state switch
    {
        DepartureState.InForce => "in force",
        DepartureState.NotNeeded => "not needed: nothing nonconforming to accept",
        DepartureState.Expired => "expired: its last day is past",
        DepartureState.Forbidden => "forbidden: the rule allows no departure",
        _ => "matches no finding of this audit",
    };

    private List<UncoveredPart> NotCovered() =>
        [.. _register.NotCovered(_result.Rules).GroupBy(row => row.Part)
            .Select(part => new UncoveredPart(part.Key, [.. part.Where(row => row.IsDecidable)], [.. part.Where(row => !row.IsDecidable)]))];
}
