using Auditor.Formulas.Types;
using Auditor.Quantities;

namespace Auditor.Formulas.Subjects;

/// <summary>A choice that the standards leave open, settled by the rule set.</summary>
/// <param name="Name">Name in formulas, after <c>param.</c></param>
/// <param name="Index">Slot number among the parameters of the rule set.</param>
/// <param name="Type">What it holds.</param>
/// <param name="Unit">Unit in which people read it; null for anything but a quantity.</param>
public sealed record ParameterSlot(string Name, int Index, FormulaType Type, Unit? Unit);
