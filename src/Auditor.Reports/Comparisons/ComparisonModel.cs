using Auditor.Engine.Comparisons;

namespace Auditor.Reports.Comparisons;

/// <summary>
/// Everything that a report of a comparison may show, as text ready to be shown. Templates reach it as <c>report</c>, with members in
/// lower case and underscores (<c>report.rule_set.changes</c>).
/// </summary>
public sealed record ComparisonModel
{
    /// <summary>The earlier revision.</summary>
    public required ComparedRevision Before { get; init; }

    /// <summary>The later revision.</summary>
    public required ComparedRevision After { get; init; }

    /// <summary>The files of the design, with their hashes in either revision, by path.</summary>
    public required IReadOnlyList<ComparedFile> Files { get; init; }

    /// <summary>How many findings of the later revision are new or worse.</summary>
    public required int NewOrWorse { get; init; }

    /// <summary>Findings that a reviewer has to look at, by kind, what needs action first; a kind without findings is left out.</summary>
    public required IReadOnlyList<ChangedFindings> Findings { get; init; }

    /// <summary>Findings that conform as before with another margin, those closer to the limit first.</summary>
    public required IReadOnlyList<ChangedFindings> Margins { get; init; }

    /// <summary>Nonconforming, departed and undetermined findings that are as before.</summary>
    public required ChangedFindings Unchanged { get; init; }

    /// <summary>Changed inputs, those that one place of the design changed for many subjects told once.</summary>
    public required IReadOnlyList<ChangedInput> Inputs { get; init; }

    /// <summary>Whether both revisions tell what the design states; otherwise no input is listed.</summary>
    public required bool KnowsInputs { get; init; }

    /// <summary>Whether the causes of each change are known; a findings file does not tell them.</summary>
    public required bool KnowsCauses { get; init; }

    /// <summary>Subjects added, renamed, moved and removed.</summary>
    public required IReadOnlyList<ChangedSubject> Subjects { get; init; }

    /// <summary>Departures that differ.</summary>
    public required IReadOnlyList<ChangedDeparture> Departures { get; init; }

    /// <summary>How the rule sets differ.</summary>
    public required ChangedRuleSet RuleSet { get; init; }

    /// <summary>The caution.</summary>
    public string Caution { get; } = Model.Caution.Text;

    /// <summary>Builds the model of a comparison.</summary>
    public static ComparisonModel Build(RevisionComparison comparison) => new ComparisonBuilder(comparison).Build();
}
