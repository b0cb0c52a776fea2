namespace Auditor.Documents;

/// <summary>The text of a file, how many bytes it has, and their SHA-256.</summary>
internal sealed record SourceFile(SourceText Text, int Bytes, string Sha256);
