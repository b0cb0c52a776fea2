using ApprovalTests;
using ApprovalTests.Core;

namespace Auditor.Testing;

/// <summary>
/// Compares a text with a file of the checkout that holds what the text should be, its golden file. Golden files lie beside the input
/// that they belong to, as <c>&lt;name&gt;.approved.&lt;extension&gt;</c>. A text that differs is written as <c>&lt;name&gt;.received.&lt;extension&gt;</c>
/// beside it and the test fails; to accept it, rename it. Nothing here writes or removes a golden file.
/// </summary>
public static class Golden
{
    private const string Approved = ".approved.";
    private const string Received = ".received.";

    /// <summary>Compares a text with a golden file.</summary>
    /// <param name="text">The text; lines end with LF.</param>
    /// <param name="path">The path of the golden file without <c>.approved</c> and its extension.</param>
    /// <param name="extension">The extension, without its dot.</param>
    public static void Match(string text, string path, string extension = "txt")
    {
        var full = Repository.PathOf(path);
        Approvals.Verify(new PlainWriter(text, extension), new Namer(full), QuietReporter.Instance);
    }

    /// <summary>
    /// Lists the golden files below a folder that belong to nothing: no file or folder beside them bears their name. A golden
    /// file that is left over checks nothing, and so is to be deleted.
    /// </summary>
    public static IReadOnlyList<string> OrphansBelow(string folder)
    {
        var root = Repository.PathOf(folder);
        return [.. Directory.EnumerateFiles(root, $"*{Approved}*", SearchOption.AllDirectories).Where(IsOrphan)
            .Select(file => Path.GetRelativePath(root, file)).Order(StringComparer.Ordinal)];
    }

    private static bool IsOrphan(string golden)
    {
        var name = Path.GetFileName(golden);
        name = name[..name.IndexOf(Approved, StringComparison.Ordinal)];
        return !Directory.EnumerateFileSystemEntries(Path.GetDirectoryName(golden)!)
            .Select(entry => Path.GetFileName(entry))
            .Any(entry => !entry.Contains(Approved, StringComparison.Ordinal) && !entry.Contains(Received, StringComparison.Ordinal)
                && (entry == name || entry.StartsWith(name + ".", StringComparison.Ordinal)));
    }

    private sealed class Namer(string path) : IApprovalNamer
    {
        public string SourcePath { get; } = Path.GetDirectoryName(path)!;

        public string Name { get; } = Path.GetFileName(path);
    }

    /// <summary>Writes the text as it is: no byte order mark, no change of line breaks.</summary>
    private sealed class PlainWriter(string text, string extension) : IApprovalWriter
    {
        public string GetApprovalFilename(string basename) => basename + Approved + extension;

        public string GetReceivedFilename(string basename) => basename + Received + extension;

        public string WriteReceivedFile(string received)
        {
            File.WriteAllText(received, text);
            return received;
        }
    }

    /// <summary>Opens no viewer: the failure of the test says which files to compare.</summary>
    private sealed class QuietReporter : IApprovalFailureReporter
    {
        public static readonly QuietReporter Instance = new();

        public void Report(string approved, string received)
        {
        }
    }
}
