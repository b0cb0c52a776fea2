namespace Auditor.Documents;

/// <summary>How much a document may ask of the reader. Counts run over the top file and all that it includes.</summary>
/// <param name="Bytes">How many bytes all files together may have.</param>
/// <param name="Values">How many values all files together may state.</param>
/// <param name="Nesting">How deep values may lie in one another.</param>
/// <param name="Files">How many files may be read, a file included twice counting twice.</param>
/// <param name="IncludeDepth">How many inclusions may lie in one another.</param>
public sealed record ReadingLimits(long Bytes, int Values, int Nesting, int Files, int IncludeDepth)
{
    /// <summary>64 MiB, two million values, 64 levels, 1,000 files, 8 inclusions in one another.</summary>
    public static ReadingLimits Default { get; } = new(64L * 1024 * 1024, 2_000_000, 64, 1_000, 8);
}
