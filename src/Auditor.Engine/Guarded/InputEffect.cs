namespace Auditor.Engine.Guarded;

/// <summary>What one toleranced input alone can do to a finding, every other input as stated.</summary>
/// <param name="Input">The input.</param>
/// <param name="Worst">The value of it that is worst for the finding.</param>
/// <param name="Loss">
/// How much margin that costs, in the measure of the finding's margin; null where the finding then has no margin to compare.
/// </param>
/// <param name="IsMonotone">Whether the finding gets ever better, or ever worse, from the least to the greatest value.</param>
public sealed record InputEffect(TolerancedInput Input, double Worst, double? Loss, bool IsMonotone);
