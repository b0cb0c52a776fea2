namespace Auditor.Engine.Guarded;

/// <summary>Where an input lies in the worst case.</summary>
/// <param name="Input">The input.</param>
/// <param name="Number">Its value, in coherent units.</param>
public sealed record CornerValue(TolerancedInput Input, double Number);
