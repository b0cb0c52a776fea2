using Auditor.Engine.Variation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Adjustments;

/// <summary>An input with another value than the design has.</summary>
/// <param name="Input">The input.</param>
/// <param name="After">The other value.</param>
public sealed record ChangedInput(SubjectInput Input, Value After);
