namespace Auditor.Reports.Comparisons;

/// <summary>What became of one finding. Texts that do not apply are empty.</summary>
public sealed record ChangedFinding
{
    /// <summary>Stable key in the later revision, or in the earlier one where it is gone.</summary>
    public required string Key { get; init; }

    /// <summary>Id of the rule.</summary>
    public required string Rule { get; init; }

    /// <summary>What is right when it conforms.</summary>
    public required string Title { get; init; }

    /// <summary>Key of the subject.</summary>
    public required string Subject { get; init; }

    /// <summary>Whether the rule is a requirement; otherwise it is a recommendation.</summary>
    public required bool IsRequirement { get; init; }

    /// <summary>The sentence of the finding, of the later revision where it has one.</summary>
    public required string Sentence { get; init; }

    /// <summary>The finding in the earlier revision.</summary>
    public required FindingState Before { get; init; }

    /// <summary>The finding in the later revision.</summary>
    public required FindingState After { get; init; }

    /// <summary>Whether the limit differs.</summary>
    public required bool HasOtherLimit { get; init; }

    /// <summary>What moved it: design, rule set, departure.</summary>
    public required string MovedBy { get; init; }

    /// <summary>The changes that it rests on, one line each; empty where they are not known.</summary>
    public required IReadOnlyList<string> Causes { get; init; }
}
