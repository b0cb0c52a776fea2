using Auditor.Engine.Adjustments;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Limits;

/// <summary>How far one adjustable input may go.</summary>
public sealed record InputLimit
{
    /// <summary>The input.</summary>
    public required Adjustable Input { get; init; }

    /// <summary>What a reading should show if the work is as designed; missing where nothing is said or known.</summary>
    public required Value Expected { get; init; }

    /// <summary>The rules that it has a part in and that apply at some value, in the order of findings.</summary>
    public required IReadOnlyList<RuleLimit> Rules { get; init; }

    /// <summary>The stretches at which all requirements are kept that the input can help; none where no value keeps them all.</summary>
    public required IReadOnlyList<AllowedRange> Required { get; init; }

    /// <summary>The stretch of those around the stated value, or nearest to it; null where there is none.</summary>
    public required AllowedRange? Around { get; init; }

    /// <summary>The same with the recommendations as well; null where they leave nothing.</summary>
    public required AllowedRange? Advised { get; init; }

    /// <summary>
    /// For a reading: the stretch that is left when the uncertainty of the instrument is used up against it; null for other inputs, where no
    /// uncertainty is known, and where it leaves nothing.
    /// </summary>
    public required AllowedRange? Guarded { get; init; }

    /// <summary>Whether a guarded stretch was looked for.</summary>
    public required bool IsGuarded { get; init; }
}
