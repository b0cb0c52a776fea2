using Auditor.Formulas.Subjects;

namespace Auditor.Formulas.Binding;

/// <summary>A quantity that a formula reads, and which way it looks for it.</summary>
/// <param name="Shape">Shape of the subject that has the quantity.</param>
/// <param name="Slot">The quantity.</param>
/// <param name="Direction">Towards the origin, towards the loads, both in one chain, or at the same subject.</param>
public readonly record struct Reference(SubjectShape Shape, QuantitySlot Slot, Direction Direction);
