namespace Auditor.Documents;

/// <summary>The text of a file and the hash of its bytes.</summary>
internal sealed record SourceFile(SourceText Text, string Sha256);
