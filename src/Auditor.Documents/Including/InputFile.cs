namespace Auditor.Documents;

/// <summary>A file that was read.</summary>
/// <param name="Path">The path to show.</param>
/// <param name="Sha256">The SHA-256 of its bytes, as 64 lower-case hexadecimal digits.</param>
public sealed record InputFile(string Path, string Sha256);
