using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Adjustments;

/// <summary>Values written out one by one, such as the types of circuit-breakers.</summary>
/// <param name="Steps">The values, in their order.</param>
public sealed record StepLadder(IReadOnlyList<Value> Steps) : Ladder
{
    /// <inheritdoc/>
    public override IReadOnlyList<Value> StepsAt(ISubject subject) => Steps;
}
