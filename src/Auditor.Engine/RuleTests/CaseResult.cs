using Auditor.Documents;

namespace Auditor.Engine.RuleTests;

/// <summary>How one case went.</summary>
/// <param name="Owner">Rule id, or sheet and symbol.</param>
/// <param name="Name">Name of the case.</param>
/// <param name="Failure">What was expected and what came; null when it passed.</param>
/// <param name="Span">Where the case stands.</param>
public sealed record CaseResult(string Owner, string Name, string? Failure, SourceSpan Span);
