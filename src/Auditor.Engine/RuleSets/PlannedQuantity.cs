using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.RuleSets;

/// <summary>Something that a picture draws or writes of one kind of subject.</summary>
/// <param name="Shape">Kind of subject.</param>
/// <param name="Role">What it is to the picture, as the kind of picture calls it.</param>
/// <param name="Label">What a reader calls it: the label that the file gives, else the name of the quantity, else the formula.</param>
/// <param name="Formula">How it is computed.</param>
/// <param name="IsLabelled">Whether the file gives the label, which is then written before the value.</param>
public sealed record PlannedQuantity(SubjectShape Shape, string Role, string Label, Formula Formula, bool IsLabelled)
{
    /// <summary>Its value for a subject; missing where it cannot be computed.</summary>
    public Value Of(DesignSubject subject) => Formula.Evaluate(subject.Scope);

    /// <summary>Its value for a subject as shown, with its unit.</summary>
    public string Show(DesignSubject subject) => ValueText.Show(Of(subject), Formula.Unit);
}
