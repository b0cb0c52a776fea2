namespace Auditor.Hostile.Tests.Cases;

/// <summary>Places where nothing can be written.</summary>
internal static class OutputCases
{
    public static IReadOnlyList<HostileCase> All { get; } =
    [
        Writing("write-into-no-folder", "{folder}/none/site.md"),
        Writing("write-over-folder", "{folder}/taken.md"),
        Writing("write-into-file", "{folder}/site.design.yaml/site.md"),
        Writing("write-where-nobody-may", "/proc/site.md"),
        Writing("write-name-too-long", "{folder}/" + new string('n', 300) + ".md"),
        Writing("write-without-ending", "/dev/full"),
        Writing("write-over-link", "{folder}/link.md"),
        new("new-over-design", folder => folder.Write("site.design.yaml", "mine"), "new", "{folder}/site"),
        new("remedies-where-nobody-may", folder => folder.With("set: firm\ntitle: Firm\n"), "remedies", "{folder}/site.design.yaml", "--write", "/proc/site.md"),
    ];

    private static HostileCase Writing(string name, string path) => new(
        name,
        folder => folder.With("set: firm\ntitle: Firm\n").Write("taken.md/inside.txt", "").Write("other.txt", "kept").Link("link.md", "other.txt"),
        "audit", "{folder}/site.design.yaml", "--quiet", "--write", path);
}
