using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Adjustments;

/// <summary>Every value between two bounds, both allowed.</summary>
/// <param name="From">The least value, in coherent units.</param>
/// <param name="To">The greatest value, in coherent units.</param>
public sealed record RangeLadder(double From, double To) : Ladder
{
    /// <inheritdoc/>
    public override IReadOnlyList<Value>? StepsAt(ISubject subject) => null;
}
