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
    public static bool Write(string path, byte[] bytes, Problems problems) => Write(path, stream => stream.Write(bytes), problems);

    /// <summary>Writes a file beside its target as <see cref="Write(string, byte[], Problems)"/> does, piece by piece.</summary>
    /// <param name="path">Where to write.</param>
    /// <param name="content">Writes the content.</param>
    /// <param name="problems">Receives the reason when it cannot be written.</param>
    /// <returns>Whether it was written.</returns>
    public static bool Write(string path, Action<Stream> content, Problems problems)
    {
        var full = Path.GetFullPath(path);
        var folder = Path.GetDirectoryName(full);
        if (!Directory.Exists(folder))
        {
            problems.Add(FileMessages.NoFolder(path));
            return false;
        }

        var beside = Path.Combine(folder, "." + Path.GetRandomFileName());
        Leftovers.Expect(beside);
        try
        {
            WriteWhole(beside, content);
            File.Move(beside, full, overwrite: true);
            return true;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException || IsTooLarge(fault))
        {
            problems.Add(Directory.Exists(full) ? FileMessages.IsFolder(path) : FileMessages.Failed(path, Reason(fault)));
            return false;
        }
        finally
        {
            Leftovers.Remove(beside);
        }
    }

    private static void WriteWhole(string path, Action<Stream> content)
    {
        using var stream = new FileStream(path, FileMode.CreateNew, FileAccess.Write, FileShare.None);
        content(stream);
        stream.Flush(flushToDisk: true);
    }

    /// <summary>Whether the system takes no file of that length, which the library tells as if it were the fault of an argument.</summary>
    private static bool IsTooLarge(Exception fault) =>
        fault is ArgumentOutOfRangeException { ParamName: "value" } && fault.Message.StartsWith("Specified file length", StringComparison.Ordinal);

    /// <summary>The reason without the paths of the machine that the system's message ends with.</summary>
    private static string Reason(Exception fault) =>
        fault is UnauthorizedAccessException ? "permission is denied"
            : IsTooLarge(fault) ? "it would be larger than files may be there"
            : fault.Message.Split([" : '", " '"], 2, StringSplitOptions.None)[0].ToLowerInvariant();
}
