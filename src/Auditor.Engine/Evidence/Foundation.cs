using Auditor.Documents;

namespace Auditor.Engine.Evidence;

/// <summary>Something that a finding rests on and that a reader should know to be less than certain.</summary>
/// <param name="Kind">What it is.</param>
/// <param name="Subject">Key of the subject that has the input; null for a figure.</param>
/// <param name="Name">Input, parameter, table or curve.</param>
/// <param name="Text">The value as written; empty for a whole table.</param>
/// <param name="Span">Where it stands; null where only its file is known.</param>
public sealed record Foundation(FoundationKind Kind, string? Subject, string Name, string Text, SourceSpan? Span);
