namespace Auditor.Engine.Findings;

/// <summary>Signed distance to the limit; positive on the right side.</summary>
/// <param name="Absolute">Distance in coherent units.</param>
/// <param name="Relative">Distance as a share of the limit; null where the limit is zero.</param>
public sealed record Margin(double Absolute, double? Relative);
