using Auditor.Formulas.Subjects;

namespace Auditor.Formulas.Values;

/// <summary>One thing that is missing, and what to do about it.</summary>
/// <param name="Kind">The kind of thing.</param>
/// <param name="Subject">Key of the subject that it is missing from; empty where it belongs to the rule data.</param>
/// <param name="Name">The input as the design file writes it (<c>cable.length</c>), or the table, curve or way.</param>
/// <param name="Why">What is wrong, as a clause without a full stop.</param>
/// <param name="Help">What to give instead; empty where the name says it all.</param>
public sealed record Absence(AbsenceKind Kind, string Subject, string Name, string Why, string Help)
{
    /// <summary>An input that a subject does not give.</summary>
    /// <param name="subject">The subject.</param>
    /// <param name="slot">Slot number of the input.</param>
    public static Absence OfInput(ISubject subject, int slot)
    {
        var input = subject.Shape.Inputs[slot];
        return new Absence(AbsenceKind.Input, subject.Key, input.Path, input.WhenNotGiven, "");
    }

    /// <summary>The absence as one readable line.</summary>
    public override string ToString()
    {
        var where = Subject.Length == 0 ? "" : Subject + ": ";
        return Help.Length == 0 ? $"{where}{Why}" : $"{where}{Why}; {Help}";
    }
}
