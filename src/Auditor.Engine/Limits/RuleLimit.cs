using Auditor.Engine.Variation;

namespace Auditor.Engine.Limits;

/// <summary>How one rule bounds one adjustable input.</summary>
/// <param name="At">The rule and the subject that it judges.</param>
/// <param name="Kind">How it bounds the input.</param>
/// <param name="Kept">The stretches of values at which it is kept, ascending; none where it never is.</param>
public sealed record RuleLimit(RuleAt At, LimitKind Kind, IReadOnlyList<KeptRange> Kept);
