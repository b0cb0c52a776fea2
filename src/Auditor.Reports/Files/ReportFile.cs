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
    public static bool Write(string path, ReadOnlySpan<byte> bytes, Problems problems)
    {
        var full = Path.GetFullPath(path);
        var folder = Path.GetDirectoryName(full);
        if (!Directory.Exists(folder))
        {
            problems.Add(FileMessages.NoFolder(path));
            return false;
        }

        var beside = Path.Combine(folder, "." + Path.GetRandomFileName());
        try
        {
            WriteWhole(beside, bytes);
            File.Move(beside, full, overwrite: true);
            return true;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            problems.Add(Directory.Exists(full) ? FileMessages.IsFolder(path) : FileMessages.Failed(path, Reason(fault)));
        }

        Remove(beside);
        return false;
    }

    private static void WriteWhole(string path, ReadOnlySpan<byte> bytes)
    {
        using var stream = new FileStream(path, FileMode.CreateNew, FileAccess.Write, FileShare.None);
        stream.Write(bytes);
        stream.Flush(flushToDisk: true);
    }

    /// <summary>The reason without the paths of the machine that the system's message ends with.</summary>
    private static string Reason(Exception fault) =>
        fault is UnauthorizedAccessException
            ? "permission is denied"
            : fault.Message.Split([" : '", " '"], 2, StringSplitOptions.None)[0].ToLowerInvariant();

    private static void Remove(string path)
    {
        try
        {
            File.Delete(path);
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            // The file that could not be written cannot be removed either; the problem of the writing tells the reason.
        }
    }
}
