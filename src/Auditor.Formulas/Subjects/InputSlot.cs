using Auditor.Formulas.Types;
using Auditor.Quantities;

namespace Auditor.Formulas.Subjects;

/// <summary>One thing that the design file may say of a subject.</summary>
/// <param name="Name">Name in formulas: the path with dots, hyphens written as underscores (<c>device.breaking_capacity</c>).</param>
/// <param name="Path">The same path as the design file writes it (<c>device.breaking-capacity</c>).</param>
/// <param name="Index">Slot number among the inputs of the subject's shape.</param>
/// <param name="Type">What it holds.</param>
/// <param name="Unit">Unit in which people read it; null for anything but a quantity.</param>
public sealed record InputSlot(string Name, string Path, int Index, FormulaType Type, Unit? Unit)
{
    /// <summary>What is said where a subject does not give it.</summary>
    public string WhenNotGiven { get; } = $"`{Path}` is not given";
}
