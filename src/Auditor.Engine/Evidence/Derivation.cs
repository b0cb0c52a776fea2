namespace Auditor.Engine.Evidence;

/// <summary>How one value was computed.</summary>
/// <param name="Subject">Key of the subject.</param>
/// <param name="Symbol">Symbol of the quantity, or <c>value</c>, <c>limit</c>, <c>applies</c> of a rule.</param>
/// <param name="Name">What it is.</param>
/// <param name="Value">The value as shown.</param>
/// <param name="Formula">The formula as written.</param>
/// <param name="WithNumbers">The same with its names replaced by their values.</param>
/// <param name="References">Clauses that it comes from.</param>
/// <param name="Place">Where the formula stands, as path:line:column.</param>
/// <param name="Note">Remark of the sheet; empty for none.</param>
/// <param name="From">What it rests on, each thing once, in the order of the formula.</param>
public sealed record Derivation(
    string Subject, string Symbol, string Name, string Value, string Formula, string WithNumbers,
    IReadOnlyList<string> References, string Place, string Note, IReadOnlyList<EvidenceSource> From);
