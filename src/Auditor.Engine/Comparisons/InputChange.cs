namespace Auditor.Engine.Comparisons;

/// <summary>An input that two revisions state differently, of a subject that both have.</summary>
/// <param name="SubjectBefore">Key of the subject in the earlier revision.</param>
/// <param name="SubjectAfter">Key of the subject in the later revision.</param>
/// <param name="Path">Path of the input, as the design file writes it.</param>
/// <param name="Before">What the earlier revision states; null for nothing.</param>
/// <param name="After">What the later revision states; null for nothing.</param>
public sealed record InputChange(string SubjectBefore, string SubjectAfter, string Path, RevisionInput? Before, RevisionInput? After) : Change;
