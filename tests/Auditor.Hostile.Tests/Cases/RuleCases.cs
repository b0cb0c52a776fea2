namespace Auditor.Hostile.Tests.Cases;

/// <summary>Rule sets that came from somebody else, with files that are none, and figures without end.</summary>
internal static class RuleCases
{
    private const int Long = 5_000;

    public static IReadOnlyList<HostileCase> All { get; } =
    [
        HostileCase.Audit("set-is-device", "rule-set: /dev/zero\n" + Site.Good),
        HostileCase.Audit("set-is-pipe", folder => folder.Write("site.design.yaml", "rule-set: ./firm.yaml\n" + Site.Good).Pipe("firm.yaml")),
        HostileCase.Audit("set-uses-pipe", folder => folder.With("set: firm\ntitle: Firm\nuses: { sheets: [pipe.yaml] }\n").Pipe("firm/pipe.yaml")),
        HostileCase.Audit("set-uses-folder-with-pipe", folder => folder.With("set: firm\ntitle: Firm\nuses: { sheets: [sheets] }\n").Pipe("firm/sheets/pipe.yaml")),
        HostileCase.Audit("set-uses-above", folder => folder.With("set: firm\ntitle: Firm\nuses: { sheets: [../../etc] }\n")),
        HostileCase.Audit("set-uses-absolute", folder => folder.With("set: firm\ntitle: Firm\nuses: { sheets: [/etc/passwd] }\n")),
        HostileCase.Audit("set-uses-link", folder => folder.With("set: firm\ntitle: Firm\nuses: { sheets: [etc] }\n").Link("firm/etc", "/etc")),
        HostileCase.Audit("set-uses-folder-with-link", folder => folder.With("set: firm\ntitle: Firm\nuses: { sheets: [sheets] }\n").Link("firm/sheets/passwd.yaml", "/etc/passwd")),
        HostileCase.Audit("set-extends-itself", folder => folder.With("set: firm\ntitle: Firm\nextends: firm.yaml\n")),
        HostileCase.Audit("set-template-outside", folder => folder.With("set: firm\ntitle: Firm\ntemplates: { md: ../../../etc/passwd }\n")),
        HostileCase.Audit("set-template-is-link", folder => folder.With("set: firm\ntitle: Firm\ntemplates: { md: a.scriban-md }\n").Link("firm/a.scriban-md", "/etc/passwd")),
        HostileCase.Audit("set-with-alias-bomb", folder => folder.With("set: &a firm\ntitle: *a\n")),
        HostileCase.Audit("quantities-in-a-circle", folder => folder.With().Write("firm/provisions/none.txt", "")
            .Write("firm/sheets/firm.yaml", Firm.Sheet([.. Chain(Long), ("q0", $"q{Long - 1} + 1")]))),
        HostileCase.Audit("quantities-in-a-long-chain", folder => folder.With().Write("firm/provisions/at-most-five.yaml", Firm.Rule($"q{Long - 1}"))
            .Write("firm/sheets/firm.yaml", Firm.Sheet([("q0", "1"), .. Chain(Long)]))),
        HostileCase.Audit("quantities-that-double", folder => folder.With().Write("firm/provisions/at-most-five.yaml", Firm.Rule("q99"))
            .Write("firm/sheets/firm.yaml", Firm.Sheet([("q0", "1"), ("q1", "1"), .. Enumerable.Range(2, 98).Select(number => ($"q{number}", $"q{number - 1} + q{number - 2}"))]))),
        HostileCase.Audit("sentence-that-loops", folder => folder.With().Write("firm/sheets/none.txt", "")
            .Write("firm/provisions/at-most-five.yaml", Firm.Rule("1", "{{ while true }}{{ value }}{{ end }}"))),
        HostileCase.Audit("sentence-that-includes", folder => folder.With().Write("firm/sheets/none.txt", "")
            .Write("firm/provisions/at-most-five.yaml", Firm.Rule("1", "{{ include '/etc/passwd' }}"))),
        new("evidence-of-quantities-that-double", folder => folder.With().Write("firm/provisions/at-most-five.yaml", Firm.Rule("q99"))
            .Write("firm/sheets/firm.yaml", Firm.Sheet([("q0", "1"), ("q1", "1"), .. Enumerable.Range(2, 98).Select(number => ($"q{number}", $"q{number - 1} + q{number - 2}"))])),
            "evidence", "{folder}/site.design.yaml", "A/1 q99"),
    ];

    private static IEnumerable<(string Symbol, string Formula)> Chain(int length) => Enumerable.Range(1, length - 1).Select(number => ($"q{number}", $"q{number - 1} + 1"));
}
