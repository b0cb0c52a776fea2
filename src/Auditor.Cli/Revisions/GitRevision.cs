using System.Globalization;

namespace Auditor.Cli.Revisions;

/// <summary>A commit of the repository that the current folder belongs to, and the files that may matter to a design in it.</summary>
/// <param name="git">Runs git.</param>
/// <param name="commit">Id of the commit.</param>
internal sealed class GitRevision(Git git, string commit)
{
    private static readonly string[] Endings = [".yaml", ".yml", ".json", ".scriban-html", ".scriban-md", ".scriban-txt"];

    /// <summary>Whether the current folder belongs to a repository.</summary>
    public static bool IsInRepository(Git git) => git.Read("rev-parse", "--git-dir") is not null;

    /// <summary>Folder of the current folder within its repository, with a slash at its end; empty at the top and in a bare repository.</summary>
    public static string Prefix(Git git) => git.Read("rev-parse", "--show-prefix")?.TrimEnd('\n') ?? "";

    /// <summary>The commit that a revision names; null when there is none, or the text could be taken for anything but a revision.</summary>
    public static GitRevision? Find(Git git, string revision)
    {
        if (revision.Length == 0 || revision[0] == '-' || revision.Any(char.IsControl))
        {
            return null;
        }

        // What excludes a revision is answered as such, with a sign before the id.
        var id = git.Read("rev-parse", "--verify", "--quiet", "--end-of-options", revision + "^{commit}")?.TrimEnd('\n');
        return id?.All(char.IsAsciiHexDigit) == true ? new GitRevision(git, id) : null;
    }

    /// <summary>
    /// The files of the commit that design, rule or findings files may be: by their endings, regular files alone. Symbolic links and
    /// submodules are left out, and so are paths that no working tree could hold.
    /// </summary>
    public IReadOnlyList<GitFile> Files() =>
        [.. (git.Read("ls-tree", "-r", "-z", "-l", "--full-tree", commit, "--") ?? "")
            .Split('\0', StringSplitOptions.RemoveEmptyEntries).Select(Parse).OfType<GitFile>()
            .OrderBy(file => file.Path, StringComparer.Ordinal)];

    /// <summary>Reads the contents of files.</summary>
    /// <param name="files">The files.</param>
    /// <param name="take">Receives each file with its content, in their order.</param>
    /// <returns>Whether all could be read.</returns>
    public bool Read(IReadOnlyList<GitFile> files, Action<GitFile, byte[]> take) =>
        git.Exchange(["cat-file", "--batch"], files.Select(file => file.Id), stream => files.All(file => ReadOne(stream, file, take)));

    private static GitFile? Parse(string entry)
    {
        // mode SP type SP id SP+ size TAB path
        var tab = entry.IndexOf('\t');
        var parts = tab < 0 ? [] : entry[..tab].Split(' ', StringSplitOptions.RemoveEmptyEntries);
        if (parts is not ["100644" or "100755", "blob", var id, var size] || !long.TryParse(size, NumberStyles.None, CultureInfo.InvariantCulture, out var bytes))
        {
            return null;
        }

        var path = entry[(tab + 1)..];
        return Endings.Any(ending => path.EndsWith(ending, StringComparison.Ordinal)) && IsPlain(path) ? new GitFile(path, id, bytes) : null;
    }

    /// <summary>Whether a path stays below where it is put, whatever wrote it into the repository.</summary>
    private static bool IsPlain(string path) =>
        !path.Contains('\\') && !path.Contains(':') && path.Split('/').All(part => part is not ("" or "." or ".."));

    private static bool ReadOne(Stream stream, GitFile file, Action<GitFile, byte[]> take)
    {
        // id SP type SP size LF, the content, LF
        for (var read = stream.ReadByte(); read != '\n'; read = stream.ReadByte())
        {
            if (read < 0)
            {
                return false;
            }
        }

        var content = new byte[file.Bytes];
        if (stream.ReadAtLeast(content, content.Length, throwOnEndOfStream: false) < content.Length || stream.ReadByte() != '\n')
        {
            return false;
        }

        take(file, content);
        return true;
    }
}
