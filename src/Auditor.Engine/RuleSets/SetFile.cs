using Auditor.Documents;

namespace Auditor.Engine.RuleSets;

/// <summary>A set file, and the folder that its paths are relative to.</summary>
/// <param name="File">The file.</param>
/// <param name="Folder">Full path of the folder of its rule data.</param>
/// <param name="Display">How files of that folder are shown.</param>
/// <param name="IsInSets">Whether its file stands in a folder called <c>sets</c>, and its rule data in the folder above.</param>
/// <param name="Standing">What it is to the sets that it is built on.</param>
internal sealed record SetFile(RuleFile File, string Folder, string Display, bool IsInSets, SetStanding Standing)
{
    /// <summary>Its root mapping.</summary>
    public MappingNode Root => File.Root;

    /// <summary>Its name.</summary>
    public string Id => Root.Text("set")!;

    /// <summary>The files of some kinds that it uses, each once and with the path to show, in the order of the set and then by name.</summary>
    /// <param name="kinds">Keys of <c>uses</c>.</param>
    /// <param name="problems">Receives paths that are not there or lead outside.</param>
    public IReadOnlyList<(string Full, string Display)> Files(IEnumerable<string> kinds, Problems problems)
    {
        var files = new List<(string, string)>();
        foreach (var path in kinds.SelectMany(kind => Root.Mapping("uses")?.Items(kind) ?? []).OfType<ScalarNode>())
        {
            files.AddRange(Expand(path, problems));
        }

        return [.. files.DistinctBy(file => file.Item1)];
    }

    /// <summary>Whether both stand in one folder <c>sets</c>.</summary>
    public bool SharesSets(SetFile other) => Folder == other.Folder && IsInSets && other.IsInSets;

    /// <summary>The templates that it brings, by the ending of the reports that they write.</summary>
    /// <param name="problems">Receives paths that are not there or lead outside.</param>
    public IEnumerable<(string Ending, SetTemplate Template)> Templates(Problems problems)
    {
        foreach (var entry in Root.Mapping("templates")?.Entries ?? [])
        {
            if (Expand((ScalarNode)entry.Value, problems) is [var (full, display)])
            {
                yield return ("." + entry.Key.Value, new SetTemplate(full, display));
            }
        }
    }

    private List<(string Full, string Display)> Expand(ScalarNode path, Problems problems)
    {
        var full = Path.GetFullPath(Path.Combine(Folder, path.Text));
        if (!Holds(full))
        {
            problems.Add(RuleMessages.OutsideRoot(path.Span, path.Text));
            return [];
        }

        if (System.IO.File.Exists(full))
        {
            return [(full, Show(full))];
        }

        if (!Directory.Exists(full))
        {
            problems.Add(RuleMessages.NoSuchPath(path.Span, path.Text));
            return [];
        }

        // What cannot be looked into is told: a rule that is passed over could be the one that is broken.
        var options = new EnumerationOptions { RecurseSubdirectories = true, AttributesToSkip = FileAttributes.ReparsePoint, IgnoreInaccessible = false };
        try
        {
            return [.. Directory.EnumerateFiles(full, "*.yaml", options).Order(StringComparer.Ordinal).Select(file => (file, Show(file)))];
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            problems.Add(RuleMessages.UnreadableFolder(path.Span, path.Text));
            return [];
        }
    }

    /// <summary>Whether a path lies in the folder, and no symbolic link along it leads elsewhere.</summary>
    public bool Holds(string full) => Enclosure.Holds(Folder, full);

    private string Show(string full)
    {
        var path = Path.GetRelativePath(Folder, full).Replace('\\', '/');
        return Display == "." ? path : $"{Display}/{path}";
    }
}
