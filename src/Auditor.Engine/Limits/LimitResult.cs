using Auditor.Engine.Installation;

namespace Auditor.Engine.Limits;

/// <summary>How far the adjustable inputs of a design may go.</summary>
/// <param name="Design">The design.</param>
/// <param name="Inputs">The inputs, in the order of subjects and then of adjustments by name.</param>
/// <param name="Judged">How many times a rule was judged to find out.</param>
public sealed record LimitResult(Design Design, IReadOnlyList<InputLimit> Inputs, long Judged);
