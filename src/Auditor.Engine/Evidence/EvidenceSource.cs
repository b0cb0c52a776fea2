namespace Auditor.Engine.Evidence;

/// <summary>One thing that a formula rests on.</summary>
/// <param name="Kind">What it is.</param>
/// <param name="Label">Its name: input path, symbol, parameter, table with row and column, curve.</param>
/// <param name="Text">Its value as shown.</param>
/// <param name="Place">Where it stands, as path:line:column; empty where it has no place of its own.</param>
/// <param name="Remark">Standing of an input, source and trust of a figure; empty for nothing.</param>
/// <param name="Derivation">How a quantity was computed in turn; null for anything else, or where it is told elsewhere in the same evidence.</param>
public sealed record EvidenceSource(EvidenceKind Kind, string Label, string Text, string Place, string Remark, Derivation? Derivation);
