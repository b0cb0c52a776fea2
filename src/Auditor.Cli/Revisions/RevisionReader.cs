using Auditor.Cli.Commands;
using Auditor.Documents;
using Auditor.Engine.Comparisons;
using Auditor.Reports.Json;

namespace Auditor.Cli.Revisions;

/// <summary>
/// Reads what is to be compared: a design file, a findings file (<c>.json</c>), or either of them in a revision of the git repository
/// that the current folder belongs to (<c>REVISION:path</c>).
/// </summary>
/// <param name="auditing">Audits designs.</param>
/// <param name="problems">Receives everything that stands in the way.</param>
internal sealed class RevisionReader(Auditing auditing, Problems problems)
{
    private const string FindingsEnding = ".json";

    /// <summary>Reads one side of a comparison; null, with problems added, when it cannot be read.</summary>
    public Revision? Read(string argument)
    {
        var path = DesignPaths.Tidy(argument);
        var colon = path.IndexOf(':');
        return colon < 0 || File.Exists(path)
            ? Read(Path.GetFullPath(path), path, path, Environment.CurrentDirectory)
            : ReadRevision(path, path[..colon], path[(colon + 1)..]);
    }

    private Revision? Read(string fullPath, string name, string display, string within)
    {
        if (name.EndsWith(FindingsEnding, StringComparison.OrdinalIgnoreCase))
        {
            return FindingsFile.Read(fullPath, name, Shipped.Rules, problems);
        }

        return auditing.Run(fullPath, display, within) is { } audit ? Revision.Of(name, audit) : null;
    }

    private Revision? ReadRevision(string name, string revision, string path)
    {
        if (GitProgram.Find() is not { } program)
        {
            problems.Add(RevisionMessages.NoGit(name));
            return null;
        }

        var git = new Git(program);
        if (!GitRevision.IsInRepository(git))
        {
            problems.Add(RevisionMessages.NoRepository(name));
            return null;
        }

        if (GitRevision.Find(git, revision) is not { } commit)
        {
            problems.Add(RevisionMessages.UnknownRevision(revision));
            return null;
        }

        var files = commit.Files();
        var wanted = FromTop(git, path);
        if (files.FirstOrDefault(file => file.Path == wanted) is not { } file)
        {
            problems.Add(RevisionMessages.UnknownPath(revision, path, NearestWord.Find(path, files.Select(known => known.Path))));
            return null;
        }

        // A findings file stands by itself; a design may include files and name a rule set of the same revision.
        IReadOnlyList<GitFile> needed = wanted.EndsWith(FindingsEnding, StringComparison.OrdinalIgnoreCase)
            ? [file]
            : [.. files.Where(other => !other.Path.EndsWith(FindingsEnding, StringComparison.OrdinalIgnoreCase))];
        using var tree = RevisionTree.Write(commit, needed, revision, problems);

        // The folder of a design is what stands before the last slash, which must not be one within the revision's name.
        var display = $"{revision}:{(wanted.Contains('/') ? "" : "./")}{wanted}";
        return tree is null ? null : Read(Path.Combine(tree.Folder, wanted), name, display, tree.Folder);
    }

    /// <summary>A path from the top of the repository; git counts one that starts with a dot from the current folder.</summary>
    private static string FromTop(Git git, string path)
    {
        if (!path.StartsWith("./", StringComparison.Ordinal) && !path.StartsWith("../", StringComparison.Ordinal))
        {
            return path;
        }

        var top = Path.GetFullPath("/");
        return Path.GetRelativePath(top, Path.GetFullPath(Path.Combine(top, GitRevision.Prefix(git), path))).Replace('\\', '/');
    }
}
