namespace Auditor.Hostile.Tests.Cases;

/// <summary>Findings files that came from somebody else, compared with themselves.</summary>
internal static class FindingsCases
{
    private const string Garden = "tests/Auditor.Reports.Tests/data/designs/garden.approved.json";

    public static IReadOnlyList<HostileCase> All { get; } =
    [
        Edited("findings-sound", text => text),
        Findings("findings-deep", new string('[', 1_000_000)),
        Findings("findings-objects-deep", Site.Times(100_000, "{\"a\":")),
        Findings("findings-not-json", "a: b\n"),
        Findings("findings-empty", ""),
        Findings("findings-items-million", "{ \"findings\": [" + Site.Times(1_000_000, "1, ") + "1] }"),
        Edited("findings-number-huge", text => Replaced(text, "\"line\":1", "\"line\":1e300")),
        Edited("findings-number-infinite", text => Replaced(text, "\"line\":1", "\"line\":1e999")),
        Edited("findings-number-negative", text => Replaced(text, "\"line\":1", "\"line\":-1")),
        Edited("findings-key-twice", text => text.Insert(text.IndexOf('{') + 1, "\"findings\": [], ")),
        Edited("findings-unknown-verdict", text => Replaced(text, "\"verdict\":\"conforms\"", "\"verdict\":\"perfect\"")),
        Edited("findings-unknown-unit", text => Replaced(text, "\"unit\":\"A\"", "\"unit\":\"bananas\"")),
        new("findings-is-device", _ => { }, "compare", "/dev/zero.json", "/dev/zero.json"),
        new("findings-is-pipe", folder => folder.Pipe("a.json"), "compare", "{folder}/a.json", "{folder}/a.json"),
    ];

    private static string Replaced(string text, string old, string replacement)
    {
        Assert.Contains(old, text, StringComparison.Ordinal);
        return text.Replace(old, replacement, StringComparison.Ordinal);
    }

    private static HostileCase Findings(string name, string text) => new(name, folder => folder.Write("a.json", text), "compare", "{folder}/a.json", "{folder}/a.json");

    private static HostileCase Edited(string name, Func<string, string> edit) =>
        new(name, folder => folder.Write("a.json", edit(File.ReadAllText(Testing.Repository.PathOf(Garden)))), "compare", "{folder}/a.json", "{folder}/a.json");
}
