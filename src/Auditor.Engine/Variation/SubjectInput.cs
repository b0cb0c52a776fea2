using Auditor.Engine.Installation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Variation;

/// <summary>One input of one subject. What a named type or a board's defaults give counts for this subject alone.</summary>
/// <param name="Subject">The subject.</param>
/// <param name="Slot">The input.</param>
public readonly record struct SubjectInput(DesignSubject Subject, InputSlot Slot)
{
    /// <summary>The value as the design has it.</summary>
    public Value Stated => Subject.Input(Slot.Index);

    /// <summary>The input as people write it: subject and path.</summary>
    public override string ToString() => $"{Subject.Key} {Slot.Path}";
}
