namespace Auditor.Cli.Revisions;

/// <summary>A file of a commit.</summary>
/// <param name="Path">Path from the root of the repository.</param>
/// <param name="Id">Id of its content.</param>
/// <param name="Bytes">Size of its content.</param>
internal sealed record GitFile(string Path, string Id, long Bytes);
