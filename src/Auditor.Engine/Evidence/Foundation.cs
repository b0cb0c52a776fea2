namespace Auditor.Engine.Evidence;

/// <summary>Something that a finding rests on and that a reader should know to be less than certain.</summary>
/// <param name="Kind">What it is.</param>
/// <param name="Name">Subject and input, parameter, table or curve.</param>
/// <param name="Text">The value as written; empty for a whole table.</param>
/// <param name="Place">Where it stands.</param>
public sealed record Foundation(FoundationKind Kind, string Name, string Text, string Place);
