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
        SetFile? asker = null;
        while (true)
        {
            var (full, shown) = Locate(name, folder, display);
            if (full is null)
            {
                problems.Add(RuleMessages.UnknownSet(asked, name, NearestWord.Find(name, home.SetNames()), home.SetNames()));
                return [];
            }

            if (asker is null ? IsLinked(full, folder) : !IsShipped(full) && !asker.Holds(full))
            {
                problems.Add(asker is null ? RuleMessages.LinkedSet(asked, name) : RuleMessages.ExtendsOutside(asked!.Value, name));
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

            asker = Make(file, full, shown!);
            chain.Insert(0, asker);
            if (file.Root.Scalar("extends") is not { } next)
            {
                return [.. chain.Select((set, place) => IsHouse(chain, place) ? set with { Standing = SetStanding.House } : set)];
            }

            (name, folder, display, asked) = (next.Text, Path.GetDirectoryName(full)!, Path.GetDirectoryName(shown!)!.Replace('\\', '/'), next.Span);
        }
    }

    /// <summary>A set is a house set when it is built on a shipped one, or on one that it does not share a folder <c>sets</c> with.</summary>
    private static bool IsHouse(List<SetFile> chain, int place) =>
        place > 0 && chain[place].Standing != SetStanding.Shipped
        && (chain.Take(place).Any(set => set.Standing == SetStanding.Shipped) || !chain[place].SharesSets(chain[place - 1]));

    private bool IsShipped(string full) => Enclosure.Holds(home.Folder, full);

    /// <summary>
    /// Whether the file of a set is reached by a symbolic link: on the way to it from the folder that the path is relative to, or, where it
    /// lies elsewhere, itself.
    /// </summary>
    private static bool IsLinked(string full, string folder) =>
        !Enclosure.Holds(full.StartsWith(folder.TrimEnd('/') + "/", StringComparison.Ordinal) ? folder : Path.GetDirectoryName(full)!, full);

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
    private SetFile Make(RuleFile file, string full, string display)
    {
        var standing = IsShipped(full) ? SetStanding.Shipped : SetStanding.Own;
        var folder = Path.GetDirectoryName(full)!;
        var shown = Path.GetDirectoryName(display)?.Replace('\\', '/');
        if (Path.GetFileName(folder) != "sets")
        {
            return new SetFile(file, folder, string.IsNullOrEmpty(shown) ? "." : shown, IsInSets: false, standing);
        }

        var above = Path.GetDirectoryName(shown ?? "")?.Replace('\\', '/');
        return new SetFile(file, Path.GetDirectoryName(folder)!, string.IsNullOrEmpty(above) ? "." : above, IsInSets: true, standing);
    }
}
