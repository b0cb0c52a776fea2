namespace Auditor.Reports.Comparisons;

/// <summary>A file of the design in both revisions.</summary>
/// <param name="Path">Path relative to the folder of the design.</param>
/// <param name="Before">SHA-256 in the earlier revision; empty where that has no such file.</param>
/// <param name="After">SHA-256 in the later revision; empty where that has no such file.</param>
public sealed record ComparedFile(string Path, string Before, string After);
