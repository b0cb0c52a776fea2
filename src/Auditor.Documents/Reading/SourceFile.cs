namespace Auditor.Documents;

/// <summary>The text of a file, how many bytes it has, and their SHA-256.</summary>
/// <param name="Text">The text.</param>
/// <param name="Bytes">Length of the file in bytes.</param>
/// <param name="Sha256">SHA-256 of its bytes, in lower-case hexadecimal.</param>
public sealed record SourceFile(SourceText Text, int Bytes, string Sha256);
