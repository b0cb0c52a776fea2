using Auditor.Formulas.Values;

namespace Auditor.Engine.Limits;

/// <summary>Where a stretch of values at which a rule is kept ends. Both sides have been evaluated.</summary>
/// <param name="Position">Place of the last value, for ordering: the number of a quantity, or that of a step.</param>
/// <param name="Value">The last value at which the rule is kept.</param>
/// <param name="Beyond">A value just outside, or the next step, at which it is not.</param>
/// <param name="IsUnknownBeyond">Whether the rule cannot be judged there; otherwise it is not kept.</param>
/// <param name="Margin">The margin at the last value, relative where there is a relative one; 0 where nothing is measured.</param>
public sealed record LimitEdge(double Position, Value Value, Value Beyond, bool IsUnknownBeyond, double Margin);
