namespace Auditor.Formulas.Subjects;

/// <summary>A named list of subjects below a subject, such as the legs of a circuit.</summary>
/// <param name="Name">Name in formulas.</param>
/// <param name="Index">Number of the collection within its shape.</param>
/// <param name="Items">Shape of the items.</param>
public sealed record SubjectList(string Name, int Index, SubjectShape Items);
