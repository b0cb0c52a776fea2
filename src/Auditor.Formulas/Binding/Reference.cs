using Auditor.Formulas.Subjects;

namespace Auditor.Formulas.Binding;

/// <summary>An input or a quantity that a formula reads, and how it gets there.</summary>
/// <param name="Route">How it gets there; null at the formula's own subject.</param>
/// <param name="Shape">Shape of the subject that is read.</param>
/// <param name="Input">The input; null for a quantity.</param>
/// <param name="Quantity">The quantity; null for an input.</param>
public sealed record Reference(Route? Route, SubjectShape Shape, InputSlot? Input, QuantitySlot? Quantity)
{
    /// <summary>Towards the origin, towards the loads, both in one chain, or at the same subject.</summary>
    public Direction Direction => Route?.Direction ?? Direction.Same;
}
