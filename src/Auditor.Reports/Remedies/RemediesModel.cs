using Auditor.Documents;
using Auditor.Engine.Remedies;
using Auditor.Reports.Model;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Remedies;

/// <summary>Everything that a report on remedies may show, as text ready to be shown. Templates reach it as <c>report</c>.</summary>
public sealed record RemediesModel
{
    /// <summary>What the job is called.</summary>
    public required ReportProject Project { get; init; }

    /// <summary>File name of the design.</summary>
    public required string Design { get; init; }

    /// <summary>The rule set in force.</summary>
    public required ReportRuleSet RuleSet { get; init; }

    /// <summary>How values were held against limits, in words.</summary>
    public required string Decision { get; init; }

    /// <summary>The files of the design that were read, by path.</summary>
    public required IReadOnlyList<InputFile> Inputs { get; init; }

    /// <summary>The findings, in the order of the audit.</summary>
    public required IReadOnlyList<RemedyGroup> Groups { get; init; }

    /// <summary>How many findings have a proven remedy.</summary>
    public required int Solved { get; init; }

    /// <summary>The caution.</summary>
    public string Caution { get; } = Model.Caution.Text;

    /// <summary>Builds the model.</summary>
    public static RemediesModel Build(RemedyResult result) => Invariantly.Make(() => new RemediesBuilder(result).Build());
}
