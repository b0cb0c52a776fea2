namespace Auditor.Reports.Limits;

/// <summary>How far one input may go, ready to be shown. Texts that do not apply are empty.</summary>
public sealed record LimitsRow
{
    /// <summary>Key of the subject.</summary>
    public required string Subject { get; init; }

    /// <summary>The subject as people name it: key and name.</summary>
    public required string SubjectLabel { get; init; }

    /// <summary>The input as the design file writes it.</summary>
    public required string Input { get; init; }

    /// <summary>What it is called.</summary>
    public required string Label { get; init; }

    /// <summary>Whether it is a reading.</summary>
    public required bool IsReading { get; init; }

    /// <summary>The value that the design states.</summary>
    public required string Stated { get; init; }

    /// <summary>What a reading should show if the work is as designed.</summary>
    public required string Expected { get; init; }

    /// <summary>The least value that keeps all requirements, rounded to the safe side.</summary>
    public required string Least { get; init; }

    /// <summary>The rule that sets it, and where it judges, if elsewhere.</summary>
    public required string LeastRule { get; init; }

    /// <summary>The greatest value that keeps all requirements, rounded to the safe side.</summary>
    public required string Most { get; init; }

    /// <summary>The rule that sets it, and where it judges, if elsewhere.</summary>
    public required string MostRule { get; init; }

    /// <summary>The stretch that keeps the recommendations as well, where it is narrower.</summary>
    public required string Advised { get; init; }

    /// <summary>The stretch that is left of a reading when the uncertainty of the instrument is used up against it.</summary>
    public required string Guarded { get; init; }

    /// <summary>What more there is to say, one sentence each.</summary>
    public required IReadOnlyList<string> Notes { get; init; }
}
