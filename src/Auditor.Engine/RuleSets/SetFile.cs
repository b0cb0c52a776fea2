using Auditor.Documents;

namespace Auditor.Engine.RuleSets;

/// <summary>A set file, and the folder that its paths are relative to.</summary>
/// <param name="File">The file.</param>
/// <param name="Folder">Full path of the folder of its rule data.</param>
/// <param name="Display">How files of that folder are shown.</param>
internal sealed record SetFile(RuleFile File, string Folder, string Display)
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

    private List<(string Full, string Display)> Expand(ScalarNode path, Problems problems)
    {
        var full = System.IO.Path.GetFullPath(System.IO.Path.Combine(Folder, path.Text));
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

        var options = new EnumerationOptions { RecurseSubdirectories = true, AttributesToSkip = FileAttributes.ReparsePoint };
        return [.. Directory.EnumerateFiles(full, "*.yaml", options).Order(StringComparer.Ordinal).Select(file => (file, Show(file)))];
    }

    /// <summary>Whether a path lies in the folder, and no symbolic link along it leads elsewhere.</summary>
    public bool Holds(string full)
    {
        var root = Folder.TrimEnd('/') + "/";
        if (full != Folder && !full.StartsWith(root, StringComparison.Ordinal))
        {
            return false;
        }

        for (var at = full; at is not null && at.Length > Folder.Length; at = System.IO.Path.GetDirectoryName(at))
        {
            if (new FileInfo(at).LinkTarget is not null)
            {
                return false;
            }
        }

        return true;
    }

    private string Show(string full)
    {
        var path = System.IO.Path.GetRelativePath(Folder, full).Replace('\\', '/');
        return Display == "." ? path : $"{Display}/{path}";
    }
}
