namespace Auditor.Engine.Adjustments;

/// <summary>How an adjustment may serve as a remedy.</summary>
/// <param name="Effort">How great a change its first step is, compared with others; remedies of less effort come first.</param>
/// <param name="Way">Which way it goes.</param>
/// <param name="Most">How many steps of a ladder are tried each way.</param>
/// <param name="Share">For a range: how much of the stated value the change may take away or add, as a share of it.</param>
/// <param name="Round">For a range: what values are rounded to, on the safe side, in coherent units; 0 for no rounding.</param>
/// <param name="Adds">Whether it adds what the design has none of, and so serves only there.</param>
public sealed record RemedyTerms(int Effort, RemedyWay Way, int Most, double Share, double Round, bool Adds);
