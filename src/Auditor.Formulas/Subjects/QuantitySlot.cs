using Auditor.Formulas.Types;
using Auditor.Quantities;

namespace Auditor.Formulas.Subjects;

/// <summary>One quantity that a sheet computes for every subject of a shape.</summary>
/// <param name="Symbol">Symbol as in the standards (<c>Zs</c>, <c>R1R2</c>).</param>
/// <param name="Index">Slot number among the quantities of the shape.</param>
/// <param name="Type">What it gives, as its sheet declares.</param>
/// <param name="Unit">Unit in which people read it; null for anything but a quantity.</param>
public sealed record QuantitySlot(string Symbol, int Index, FormulaType Type, Unit? Unit);
