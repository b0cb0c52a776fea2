namespace Auditor.Formulas.Subjects;

/// <summary>A named way from a subject to one other subject, such as <c>up</c>.</summary>
/// <param name="Name">Name in formulas.</param>
/// <param name="Index">Number of the way within its shape.</param>
/// <param name="Direction">Whether it leads towards the origin or towards the loads.</param>
/// <param name="Targets">Shapes that may stand at its end; a symbol reached by it must exist on all of them.</param>
/// <param name="WhenNone">What is said of a subject that has nobody there, as in "feeds no board".</param>
public sealed record Way(string Name, int Index, Direction Direction, IReadOnlyList<SubjectShape> Targets, string WhenNone);
