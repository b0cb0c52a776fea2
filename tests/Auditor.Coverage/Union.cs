using System.Text.Json;

namespace Auditor.Coverage;

/// <summary>
/// What several test processes executed, put together: a line or a branch counts as covered when any of them came by. A line that
/// belongs to several methods, as one with a lambda does, counts once.
/// </summary>
/// <param name="sources">Full path of the folder whose files count.</param>
internal sealed class Union(string sources)
{
    private readonly Dictionary<(string Assembly, string File, int Line), bool> _lines = [];
    private readonly Dictionary<(string Assembly, string Method, int Line, int Offset, int Path), bool> _branches = [];

    /// <summary>Adds what one process executed, in the format of coverlet: assemblies, files, classes, methods, their lines and branches.</summary>
    public void Add(JsonElement measured)
    {
        foreach (var assembly in measured.EnumerateObject())
        {
            foreach (var file in assembly.Value.EnumerateObject().Where(file => Counts(file.Name)))
            {
                foreach (var method in file.Value.EnumerateObject().SelectMany(type => type.Value.EnumerateObject()))
                {
                    Add(Path.GetFileNameWithoutExtension(assembly.Name), file.Name, method);
                }
            }
        }
    }

    /// <summary>One tally for each assembly, by name.</summary>
    public IReadOnlyList<Tally> Tallies() =>
        [.. _lines.Keys.Select(line => line.Assembly).Distinct().Order(StringComparer.Ordinal).Select(name => new Tally(
            name,
            Count(_lines, line => line.Assembly == name, isCovered: true), Count(_lines, line => line.Assembly == name, isCovered: false),
            Count(_branches, branch => branch.Assembly == name, isCovered: true), Count(_branches, branch => branch.Assembly == name, isCovered: false)))];

    /// <summary>Looks at the path within the checkout alone, since a reproducible build records no other.</summary>
    private bool Counts(string file)
    {
        var parts = file.Split('/', '\\');
        var from = Array.LastIndexOf(parts, Path.GetFileName(sources)) + 1;
        return from > 0 && !parts.Contains("obj") && File.Exists(Path.Combine([sources, .. parts[from..]]));
    }

    private void Add(string assembly, string file, JsonProperty method)
    {
        foreach (var line in method.Value.GetProperty("Lines").EnumerateObject())
        {
            Enter(_lines, (assembly, file, int.Parse(line.Name)), line.Value.GetInt32());
        }

        foreach (var branch in method.Value.GetProperty("Branches").EnumerateArray())
        {
            var place = (assembly, method.Name, Number(branch, "Line"), Number(branch, "Offset"), Number(branch, "Path"));
            Enter(_branches, place, Number(branch, "Hits"));
        }
    }

    private static int Number(JsonElement branch, string name) => branch.GetProperty(name).GetInt32();

    private static void Enter<T>(Dictionary<T, bool> all, T place, int hits) where T : notnull =>
        all[place] = hits > 0 || all.GetValueOrDefault(place);

    private static int Count<T>(Dictionary<T, bool> all, Func<T, bool> isMeant, bool isCovered) where T : notnull =>
        all.Count(entry => entry.Value == isCovered && isMeant(entry.Key));
}
