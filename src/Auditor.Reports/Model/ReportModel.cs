using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Registers;
using Auditor.Reports.Reading;
using Auditor.Reports.Schedules;

namespace Auditor.Reports.Model;

/// <summary>
/// Everything that a report may show, as text ready to be shown: no template formats a number. Templates reach it as <c>report</c>,
/// with members in lower case and underscores (<c>report.rule_set.edition</c>).
/// </summary>
public sealed record ReportModel
{
    /// <summary>What the job is called.</summary>
    public required ReportProject Project { get; init; }

    /// <summary>How the audit was made.</summary>
    public required ReportBasis Basis { get; init; }

    /// <summary>The rule set in force.</summary>
    public required ReportRuleSet RuleSet { get; init; }

    /// <summary>The files of the design that were read, by path.</summary>
    public required IReadOnlyList<InputFile> Inputs { get; init; }

    /// <summary>Number of findings by verdict; every verdict is there, the gravest first.</summary>
    public required IReadOnlyList<VerdictCount> Counts { get; init; }

    /// <summary>Requirements that are not met, in the order of the design: what needs action first.</summary>
    public required IReadOnlyList<ReportFinding> Action { get; init; }

    /// <summary>All findings by verdict, the gravest first; a verdict without findings is left out.</summary>
    public required IReadOnlyList<FindingGroup> Groups { get; init; }

    /// <summary>All findings by rule: the rules with the gravest findings first, then those with the least margins.</summary>
    public IReadOnlyList<RuleFindings> Rules => MakeRules.Value;

    /// <summary>The clause types of the findings, by name.</summary>
    public required IReadOnlyList<string> ClauseTypes { get; init; }

    /// <summary>The boards, in the order of the design.</summary>
    public required IReadOnlyList<ReportBoard> Boards { get; init; }

    /// <summary>How the quantities behind the findings were computed.</summary>
    public ReportWorkings Workings => MakeWorkings.Value;

    /// <summary>The pictures that the rule set plans, for formats that can show them.</summary>
    public IReadOnlyList<ReportPicture> Pictures => MakePictures.Value;

    /// <summary>The schedule of circuits.</summary>
    public required ScheduleTable Schedule { get; init; }

    /// <summary>What is missing, by how many findings wait for it.</summary>
    public required IReadOnlyList<MissingThing> Missing { get; init; }

    /// <summary>The departures that the design records, in its order.</summary>
    public required IReadOnlyList<ReportDeparture> Departures { get; init; }

    /// <summary>The inputs marked as assumed, in the order of the design.</summary>
    public required IReadOnlyList<ReportAssumption> Assumptions { get; init; }

    /// <summary>Figures from memory that findings rest on, by name.</summary>
    public required IReadOnlyList<MemoryFigure> MemoryFigures { get; init; }

    /// <summary>The parameters of the rule set, by name.</summary>
    public required IReadOnlyList<ReportParameter> Parameters { get; init; }

    /// <summary>Rules that applied nowhere, by id.</summary>
    public required IReadOnlyList<ReportRule> NotApplied { get; init; }

    /// <summary>What no rule of the set decides, by part.</summary>
    public required IReadOnlyList<UncoveredPart> NotCovered { get; init; }

    /// <summary>The caution.</summary>
    public string Caution { get; } = Model.Caution.Text;

    internal Lazy<IReadOnlyList<RuleFindings>> MakeRules { get; init; } = new([]);

    internal Lazy<IReadOnlyList<ReportPicture>> MakePictures { get; init; } = new([]);

    internal Lazy<ReportWorkings> MakeWorkings { get; init; } = new(new ReportWorkings([], [], 0, 0));

    /// <summary>Builds the model of an audit.</summary>
    /// <param name="result">The audit.</param>
    /// <param name="register">The register of requirements.</param>
    /// <param name="schedule">Columns of the schedule of circuits.</param>
    public static ReportModel Build(AuditResult result, Register register, Schedule schedule) =>
        Invariantly.Make(() => new ReportBuilder(result, register, schedule).Build());
}
