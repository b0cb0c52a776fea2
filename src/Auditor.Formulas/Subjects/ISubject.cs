using Auditor.Formulas.Values;

namespace Auditor.Formulas.Subjects;

/// <summary>A subject while formulas are evaluated over it.</summary>
public interface ISubject
{
    /// <summary>What may be named at it.</summary>
    SubjectShape Shape { get; }

    /// <summary>Stable key of the subject, such as <c>MSB/3</c>.</summary>
    string Key { get; }

    /// <summary>The scope in which formulas of this subject are evaluated when nobody records.</summary>
    Scope Scope { get; }

    /// <summary>Value of an input slot; missing when the design does not give it.</summary>
    Value Input(int slot);

    /// <summary>Value of a quantity slot, computed at the first call.</summary>
    Value Quantity(int slot);

    /// <summary>Value of a parameter of the rule set.</summary>
    Value Parameter(int slot);

    /// <summary>The subject at the end of a way; null when there is none.</summary>
    ISubject? Go(int way);

    /// <summary>The subjects of a collection, in the order of the design file.</summary>
    IReadOnlyList<ISubject> Collection(int index);
}
