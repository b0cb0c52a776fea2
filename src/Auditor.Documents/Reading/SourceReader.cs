using System.Buffers;
using System.Security.Cryptography;
using System.Text;
using System.Text.Unicode;

namespace Auditor.Documents;

/// <summary>Reads text files that may be hostile: of any size, in any encoding, with any content.</summary>
public static class SourceReader
{
    /// <summary>Reads a UTF-8 file, with or without a byte order mark, with any line breaks.</summary>
    /// <param name="fullPath">Where the file lies.</param>
    /// <param name="displayPath">The path to show.</param>
    /// <param name="problems">Receives whatever is wrong; never throws for a bad file.</param>
    /// <param name="limits">How large the file may be; null for the default limits.</param>
    /// <returns>The text, or null when it could not be read.</returns>
    public static SourceText? Read(string fullPath, string displayPath, Problems problems, ReadingLimits? limits = null)
        => Read(fullPath, displayPath, problems, new ReadingBudget(limits ?? ReadingLimits.Default))?.Text;

    /// <summary>Reads a file as <see cref="Read(string, string, Problems, ReadingLimits?)"/> does, with the SHA-256 of its bytes.</summary>
    public static SourceFile? ReadWithHash(string fullPath, string displayPath, Problems problems)
        => ReadFile(fullPath, displayPath, problems, new ReadingBudget(ReadingLimits.Default));

    internal static SourceFile? Read(
        string fullPath, string displayPath, Problems problems, ReadingBudget budget, IReadOnlyDictionary<string, string>? texts = null)
    {
        if (texts?.GetValueOrDefault(displayPath) is { } text)
        {
            var bytes = Encoding.UTF8.GetBytes(text);
            return new SourceFile(new SourceText(displayPath, text), bytes.Length, Convert.ToHexStringLower(SHA256.HashData(bytes)));
        }

        return ReadFile(fullPath, displayPath, problems, budget);
    }

    private static SourceFile? ReadFile(string fullPath, string displayPath, Problems problems, ReadingBudget budget)
    {
        var nowhere = new SourceText(displayPath, "").WholeSpan();
        try
        {
            var file = FileAt(fullPath);
            if (!file.Exists && Directory.Exists(file.FullName))
            {
                problems.Add(FileProblems.IsFolder(nowhere));
                return null;
            }

            var bytes = ReadBytes(file, budget);
            if (bytes is null)
            {
                problems.Add(FileProblems.TooLarge(nowhere, budget.Limits.Bytes));
                return null;
            }

            return Decode(bytes, displayPath, problems) is { } text
                ? new SourceFile(text, bytes.Length, Convert.ToHexStringLower(SHA256.HashData(bytes)))
                : null;
        }
        catch (Exception fault) when (fault is FileNotFoundException or DirectoryNotFoundException)
        {
            problems.Add(FileProblems.Missing(nowhere));
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException or NotSupportedException or ArgumentException)
        {
            problems.Add(FileProblems.Unreadable(nowhere));
        }

        return null;
    }

    /// <summary>The file itself, at the end of all links: the length of a link is that of the path in it.</summary>
    private static FileInfo FileAt(string fullPath)
    {
        var file = new FileInfo(fullPath);
        return file.Attributes.HasFlag(FileAttributes.ReparsePoint) && file.ResolveLinkTarget(returnFinalTarget: true) is { } end ? new FileInfo(end.FullName) : file;
    }

    /// <summary>Reads all bytes, or returns null when there are more than allowed.</summary>
    private static byte[]? ReadBytes(FileInfo file, ReadingBudget budget)
    {
        // Pipes and devices report no length. They are not opened at all: opening one may wait for ever.
        if (file.Length == 0)
        {
            return [];
        }

        if (!budget.TrySpendBytes(file.Length))
        {
            return null;
        }

        using var handle = File.OpenHandle(file.FullName, FileMode.Open, FileAccess.Read, FileShare.ReadWrite | FileShare.Delete);
        var bytes = new byte[file.Length];
        var read = 0;
        while (read < bytes.Length && RandomAccess.Read(handle, bytes.AsSpan(read), read) is var more and > 0)
        {
            read += more;
        }

        return read == bytes.Length ? bytes : bytes[..read];
    }

    private static SourceText? Decode(ReadOnlySpan<byte> bytes, string displayPath, Problems problems)
    {
        if (bytes.StartsWith<byte>([0xFF, 0xFE]) || bytes.StartsWith<byte>([0xFE, 0xFF]))
        {
            problems.Add(FileProblems.IsUtf16(new SourceText(displayPath, "").WholeSpan()));
            return null;
        }

        var content = bytes.StartsWith<byte>([0xEF, 0xBB, 0xBF]) ? bytes[3..] : bytes;
        var buffer = ArrayPool<char>.Shared.Rent(content.Length);
        var status = Utf8.ToUtf16(content, buffer, out var read, out var written, replaceInvalidSequences: false);
        var text = new string(buffer, 0, written);
        ArrayPool<char>.Shared.Return(buffer);
        if (status != OperationStatus.Done)
        {
            var shown = new SourceText(displayPath, Encoding.UTF8.GetString(content));
            problems.Add(FileProblems.NotUtf8(new SourceSpan(shown, written, written + 1), content[read]));
            return null;
        }

        var source = new SourceText(displayPath, text);
        return ForbiddenCharacters.Report(source, problems) ? null : source;
    }
}
