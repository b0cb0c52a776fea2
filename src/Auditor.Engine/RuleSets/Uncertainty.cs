using Auditor.Formulas.Subjects;

namespace Auditor.Engine.RuleSets;

/// <summary>Says of a quantity that it is the operating uncertainty of a reading, either way (IEC 61557-1).</summary>
/// <param name="Reading">The input that is read.</param>
/// <param name="OnlyMeasured">Whether it counts only for values that the design marks as measured.</param>
public sealed record Uncertainty(InputSlot Reading, bool OnlyMeasured);
