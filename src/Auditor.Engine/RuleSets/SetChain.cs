using Auditor.Documents;

namespace Auditor.Engine.RuleSets;

/// <summary>Follows <c>extends</c> from a set to its base.</summary>
/// <param name="home">Where the shipped sets stand.</param>
/// <param name="reader">Reads and checks set files.</param>
/// <param name="problems">Receives what is wrong.</param>
internal sealed class SetChain(RuleHome home, RuleFileReader reader, Problems problems)
{
    private const int MostLinks = 16;

    /// <summary>The sets from the base to the named one; empty, with problems added, when one cannot be read.</summary>
    /// <param name="name">Name of a shipped set, or path of a set file.</param>
    /// <param name="folder">Full path of the folder that a path is relative to.</param>
    /// <param name="asked">Where the set is named, if in a file.</param>
    public IReadOnlyList<SetFile> Follow(string name, string folder, SourceSpan? asked)
    {
        var chain = new List<SetFile>();
        var seen = new HashSet<string>(StringComparer.Ordinal);
        var display = "";
        while (true)
        {
            var (full, shown) = Locate(name, folder, display);
            if (full is null)
            {
                problems.Add(RuleMessages.UnknownSet(asked, name, NearestWord.Find(name, home.SetNames()), home.SetNames()));
                return [];
            }

            if (!seen.Add(full))
            {
                problems.Add(RuleMessages.ExtendsCircle(asked!.Value, name));
                return [];
            }

            if (seen.Count > MostLinks)
            {
                problems.Add(RuleMessages.ExtendsTooLong(asked!.Value, MostLinks));
                return [];
            }

            if (reader.Read(full, shown!) is not { Kind: "set" } file)
            {
                return [];
            }

            var (root, rootShown) = RootOf(full, shown!);
            var set = new SetFile(file, root, rootShown);
            chain.Insert(0, set);
            if (file.Root.Scalar("extends") is not { } next)
            {
                return chain;
            }

            if (IsPath(next.Text) && !set.Holds(Path.GetFullPath(Path.Combine(Path.GetDirectoryName(full)!, next.Text))))
            {
                problems.Add(RuleMessages.ExtendsOutside(next.Span, next.Text));
                return [];
            }

            (name, folder, display, asked) = (next.Text, Path.GetDirectoryName(full)!, Path.GetDirectoryName(shown!)!.Replace('\\', '/'), next.Span);
        }
    }

    private (string? Full, string? Display) Locate(string name, string folder, string display)
    {
        if (!IsPath(name))
        {
            // A copy of the shipped sets is built on its own base, not on the shipped one.
            var beside = Path.Combine(folder, name + ".yaml");
            if (Path.GetFileName(folder) == "sets" && File.Exists(beside))
            {
                return (beside, display.Length == 0 ? $"{name}.yaml" : $"{display}/{name}.yaml");
            }

            var shipped = home.SetPath(name);
            return File.Exists(shipped) ? (shipped, $"{home.Display}/sets/{name}.yaml") : (null, null);
        }

        return (Path.GetFullPath(Path.Combine(folder, name)), display.Length == 0 ? Shown(name) : $"{display}/{name}");
    }

    private static bool IsPath(string name) => name.EndsWith(".yaml", StringComparison.Ordinal) || name.Contains('/');

    /// <summary>Reports name no place of a machine: an absolute path is shown by its last folder and name.</summary>
    private static string Shown(string name)
    {
        var path = name.Replace('\\', '/');
        return Path.IsPathRooted(path) ? $"{Path.GetFileName(Path.GetDirectoryName(path))}/{Path.GetFileName(path)}" : path;
    }

    /// <summary>A set in a folder called <c>sets</c> composes the files beside that folder; any other set those of its own folder.</summary>
    private static (string Folder, string Display) RootOf(string full, string display)
    {
        var folder = Path.GetDirectoryName(full)!;
        var shown = Path.GetDirectoryName(display)?.Replace('\\', '/');
        if (Path.GetFileName(folder) != "sets")
        {
            return (folder, string.IsNullOrEmpty(shown) ? "." : shown);
        }

        var above = Path.GetDirectoryName(shown ?? "")?.Replace('\\', '/');
        return (Path.GetDirectoryName(folder)!, string.IsNullOrEmpty(above) ? "." : above);
    }
}
