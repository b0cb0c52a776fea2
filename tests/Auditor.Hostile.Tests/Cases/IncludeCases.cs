namespace Auditor.Hostile.Tests.Cases;

/// <summary>Designs that include what they may not, or without end.</summary>
internal static class IncludeCases
{
    public static IReadOnlyList<HostileCase> All { get; } =
    [
        Including("include-above", "../site.design.yaml"),
        Including("include-absolute", "/etc/hostname"),
        Including("include-by-detour", "sub/../../site.design.yaml"),
        Including("include-backslash", "..\\\\site.design.yaml"),
        Including("include-address", "https://example.org/a.yaml"),
        Including("include-nothing-there", "none.yaml"),
        Including("include-folder", "sub", folder => folder.Write("sub/a.yaml", "name: x\n")),
        Including("include-link-outside", "passwd.yaml", folder => folder.Link("passwd.yaml", "/etc/passwd")),
        Including("include-folder-linked-outside", "etc/passwd", folder => folder.Link("etc", "/etc")),
        Including("include-link-in-a-circle", "a.yaml", folder => folder.Link("a.yaml", "b.yaml").Link("b.yaml", "a.yaml")),
        Including("include-link-to-device", "zero.yaml", folder => folder.Link("zero.yaml", "/dev/zero")),
        Including("include-pipe", "pipe.yaml", folder => folder.Pipe("pipe.yaml")),
        Including("include-itself", "site.design.yaml"),
        Including("include-in-a-circle", "a.yaml", folder => folder.Write("a.yaml", "include: b.yaml\n").Write("b.yaml", "include: a.yaml\n")),
        Including("include-10-deep", "0.yaml", folder => Chain(folder, 10)),
        Including("include-bomb", "0.yaml", folder => Bomb(folder, 8)),
        Including("include-no-mapping", "a.yaml", folder => folder.Write("a.yaml", "- x\n")),
        Including("include-says-it-again", "a.yaml", folder => folder.Write("a.yaml", "id: B\n")),
    ];

    private static HostileCase Including(string name, string path, Func<HostileFolder, object>? put = null) => HostileCase.Audit(name, folder =>
    {
        folder.Write("site.design.yaml", Site.Head + $"boards:\n  - include: \"{path}\"\n    {Site.Board}");
        put?.Invoke(folder);
    });

    private static HostileFolder Chain(HostileFolder folder, int files)
    {
        for (var i = 0; i < files; i++)
        {
            folder.Write($"{i}.yaml", $"include: {i + 1}.yaml\n");
        }

        return folder.Write($"{files}.yaml", "name: x\n");
    }

    /// <summary>Each file includes the next one ten times.</summary>
    private static HostileFolder Bomb(HostileFolder folder, int files)
    {
        for (var i = 0; i < files; i++)
        {
            folder.Write($"{i}.yaml", Site.Lines(10, key => $"k{key}: {{ include: {i + 1}.yaml }}"));
        }

        return folder.Write($"{files}.yaml", "name: x\n");
    }
}
