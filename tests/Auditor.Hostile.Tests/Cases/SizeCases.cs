namespace Auditor.Hostile.Tests.Cases;

/// <summary>Designs of a size beyond all sense.</summary>
internal static class SizeCases
{
    private const int Million = 1_000_000;

    public static IReadOnlyList<HostileCase> All { get; } =
    [
        HostileCase.Audit("brackets-deep", new string('[', Million)),
        HostileCase.Audit("mappings-deep", string.Concat(Enumerable.Range(0, 1000).Select(level => new string(' ', level) + "a:\n"))),
        HostileCase.Audit("dashes-deep", Site.Times(Million, "- ")),
        HostileCase.Audit("scalar-huge", "project: { title: " + new string('x', 10 * Million) + " }\n" + Site.Good),
        HostileCase.Audit("id-long", Site.Good.Replace("id: A", "id: " + new string('x', Million), StringComparison.Ordinal)),
        HostileCase.Audit("name-long", Site.Good.Replace("Lamps", new string('x', Million), StringComparison.Ordinal)),
        HostileCase.Audit("keys-million", Site.Good + Site.Lines(Million, number => $"k{number}: 1")),
        HostileCase.Audit("keys-many-unknown", Site.Good + Site.Lines(900_000, number => $"k{number}: 1")),
        HostileCase.Audit("key-one-unknown-among-many", Site.Good + "oops: 1\ntypes:\n  cables:\n" + Site.Lines(400_000, number => $"    k{number}: {{}}")),
        HostileCase.Audit("items-million-wrong", Site.Head + "boards:\n" + Site.Times(Million, "  - x\n")),
        HostileCase.Audit("nothings-million", Site.Head + "boards:\n" + Site.Times(Million, "  -\n")),
        HostileCase.Audit("file-too-large", Site.Good + "#" + new string('x', 64 * 1024 * 1024) + "\n"),
        HostileCase.Audit("line-breaks-million", Site.Good + new string('\n', Million)),
        HostileCase.Audit("comment-million", Site.Times(Million, "# x\n") + Site.Good),
        HostileCase.Audit("number-of-million-digits", Site.Good.Replace("10 m", new string('9', Million) + " m", StringComparison.Ordinal)),
    ];
}
