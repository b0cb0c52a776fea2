namespace Auditor.Documents;

/// <summary>The folder that included files must lie in: that of the top file, with all symbolic links resolved.</summary>
internal sealed class IncludeFolder
{
    private const int MostLinks = 40;

    private readonly string _root;
    private readonly string _displayRoot;

    public IncludeFolder(string topFile, string displayPath)
    {
        TopFile = RealPath(Path.GetFullPath(topFile)) ?? Path.GetFullPath(topFile);
        _root = Path.GetDirectoryName(TopFile)!;
        _displayRoot = displayPath[..(displayPath.LastIndexOf('/') + 1)];
    }

    /// <summary>The real path of the top file.</summary>
    public string TopFile { get; }

    /// <summary>Finds an included file.</summary>
    /// <param name="path">The path as written.</param>
    /// <param name="from">The real path of the file that it is written in.</param>
    /// <param name="refusal">How to word the refusal when null is returned.</param>
    /// <returns>The real path of the file, or null when there is none or it must not be read.</returns>
    public string? Find(string path, string from, out Func<SourceSpan, string, Problem> refusal)
    {
        refusal = FileProblems.IncludeOutside;
        if (path.Contains('\\'))
        {
            refusal = FileProblems.IncludeBackslash;
            return null;
        }

        if (path[0] == '/' || path.Contains(':') || Path.IsPathRooted(path))
        {
            refusal = FileProblems.IncludeAbsolute;
            return null;
        }

        var written = Path.GetFullPath(Path.Combine(Path.GetDirectoryName(from)!, path));
        if (!IsInside(written))
        {
            return null;
        }

        var real = RealPath(written);
        if (real is not null && !IsInside(real))
        {
            return null;
        }

        refusal = FileProblems.IncludeMissing;
        return File.Exists(real) ? real : null;
    }

    /// <summary>The path to show for a file in the folder.</summary>
    public string DisplayPathOf(string file) => _displayRoot + Path.GetRelativePath(_root, file).Replace('\\', '/');

    private bool IsInside(string path) => path == _root || path.StartsWith(_root.TrimEnd(Path.DirectorySeparatorChar) + Path.DirectorySeparatorChar, StringComparison.Ordinal);

    /// <summary>Follows every link on the way to a file; null when the links never end or one cannot be followed.</summary>
    private static string? RealPath(string path)
    {
        var root = Path.GetPathRoot(path)!;
        var rest = new Stack<string>(Segments(path[root.Length..]));
        var real = root;
        var links = 0;
        while (rest.TryPop(out var segment))
        {
            var next = segment == ".." ? Path.GetDirectoryName(real) ?? root : Path.Combine(real, segment);
            if (segment == ".." || LinkTarget(next) is not { } target)
            {
                real = next;
                continue;
            }

            if (++links > MostLinks)
            {
                return null;
            }

            real = Path.IsPathRooted(target) ? Path.GetPathRoot(target)! : real;
            foreach (var part in Segments(target[(Path.IsPathRooted(target) ? real.Length : 0)..]))
            {
                rest.Push(part);
            }
        }

        return real;
    }

    /// <summary>The segments of a path from the last to the first.</summary>
    private static IEnumerable<string> Segments(string path)
        => path.Split(Path.DirectorySeparatorChar, StringSplitOptions.RemoveEmptyEntries).Where(segment => segment != ".").Reverse();

    private static string? LinkTarget(string path)
    {
        try
        {
            return new FileInfo(path).LinkTarget;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            return null;
        }
    }
}
