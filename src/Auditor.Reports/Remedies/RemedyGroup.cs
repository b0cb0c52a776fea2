namespace Auditor.Reports.Remedies;

/// <summary>One finding and what would put it right.</summary>
public sealed record RemedyGroup
{
    /// <summary>Key of the finding.</summary>
    public required string Key { get; init; }

    /// <summary>The subject as people name it: key and name.</summary>
    public required string SubjectLabel { get; init; }

    /// <summary>What should be so.</summary>
    public required string Title { get; init; }

    /// <summary>The sentence of the finding.</summary>
    public required string Sentence { get; init; }

    /// <summary>The verdict.</summary>
    public required string Verdict { get; init; }

    /// <summary>Where to look in the design, as path:line:column.</summary>
    public required string Location { get; init; }

    /// <summary>The remedies, the least change first, as many as are shown.</summary>
    public required IReadOnlyList<RemedyRow> Rows { get; init; }

    /// <summary>How many more there are.</summary>
    public required int More { get; init; }

    /// <summary>Why there is none; empty where there is one.</summary>
    public required string None { get; init; }
}
