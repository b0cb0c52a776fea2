using Auditor.Documents;
using Auditor.Engine.Limits;
using Auditor.Reports.Model;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Limits;

/// <summary>Everything that a report on limits may show, as text ready to be shown. Templates reach it as <c>report</c>.</summary>
public sealed record LimitsModel
{
    /// <summary>What the job is called.</summary>
    public required ReportProject Project { get; init; }

    /// <summary>File name of the design.</summary>
    public required string Design { get; init; }

    /// <summary>The rule set in force.</summary>
    public required ReportRuleSet RuleSet { get; init; }

    /// <summary>The files of the design that were read, by path.</summary>
    public required IReadOnlyList<InputFile> Inputs { get; init; }

    /// <summary>The temperature of conductors at which readings are taken; empty where the design states none.</summary>
    public required string TestTemperature { get; init; }

    /// <summary>The subjects with adjustable inputs, in the order of the design.</summary>
    public required IReadOnlyList<LimitsGroup> Groups { get; init; }

    /// <summary>The rows to take to the site: readings to accept and greatest lengths.</summary>
    public required IReadOnlyList<LimitsRow> Site { get; init; }

    /// <summary>The caution.</summary>
    public string Caution { get; } = Model.Caution.Text;

    /// <summary>Builds the model.</summary>
    public static LimitsModel Build(LimitResult result) => Invariantly.Make(() => new LimitsBuilder(result).Build());
}
