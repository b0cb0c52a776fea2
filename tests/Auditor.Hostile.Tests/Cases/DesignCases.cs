namespace Auditor.Hostile.Tests.Cases;

/// <summary>Designs that say what a design file may not say.</summary>
internal static class DesignCases
{
    public static IReadOnlyList<HostileCase> All { get; } =
    [
        HostileCase.Audit("alias-bomb", "a: &a [x, x, x, x, x, x, x, x, x]\n" + Site.Lines(9, level => $"{(char)('b' + level)}: &{(char)('b' + level)} [{Site.Times(9, $"*{(char)('a' + level)}, ")}]")),
        HostileCase.Audit("merge-keys", Site.Good + "types:\n  cables:\n    thin: &thin { csa: 1 mm² }\n    thick: { <<: *thin, csa: 4 mm² }\n"),
        HostileCase.Audit("foreign-tag", Site.Good.Replace("Lamps", "!!python/object/apply:os.system [reboot]", StringComparison.Ordinal)),
        HostileCase.Audit("second-document", Site.Good + "---\n" + Site.Good),
        HostileCase.Audit("key-twice", Site.Good + "supply: { earthing: TT, phases: 1, voltage: 230 V }\n"),
        HostileCase.Audit("key-is-mapping", "? { a: 1 }\n: 2\n" + Site.Good),
        HostileCase.Audit("number-huge", Site.Good.Replace("10 m", "1e308 m", StringComparison.Ordinal)),
        HostileCase.Audit("number-infinite", Site.Good.Replace("10 m", "1e999 m", StringComparison.Ordinal)),
        HostileCase.Audit("number-none", Site.Good.Replace("10 m", ".nan m", StringComparison.Ordinal)),
        HostileCase.Audit("number-negative", Site.Good.Replace("10 m", "-10 m", StringComparison.Ordinal)),
        HostileCase.Audit("number-zero", Site.Good.Replace("1.5 mm²", "0 mm²", StringComparison.Ordinal)),
        HostileCase.Audit("tolerance-huge", Site.Good.Replace("10 m", "10 m ± 1e300 %", StringComparison.Ordinal)),
        HostileCase.Audit("boards-in-a-circle", Site.Head + """
            boards:
              - { id: A, fed-from: origin, circuits: [{ id: 1, feeds: B }] }
              - { id: B, circuits: [{ id: 1, feeds: C }] }
              - { id: C, circuits: [{ id: 1, feeds: B }] }
            """),
        HostileCase.Audit("boards-65-deep", Site.Head + "boards:\n" + Site.Lines(66, number =>
            $"  - {{ id: B{number}, {(number == 0 ? "fed-from: origin, " : "")}circuits: [{{ id: 1{(number < 65 ? $", feeds: B{number + 1}" : "")} }}] }}")),
        HostileCase.Audit("id-with-slash", Site.Good.Replace("id: A", "id: ../../A", StringComparison.Ordinal)),
        HostileCase.Audit("id-reserved", Site.Good.Replace("id: A", "id: bonding", StringComparison.Ordinal)),
        HostileCase.Audit("markup-in-names", Site.Good.Replace("Lamps", "\"<script>alert(1)</script> {{ include '/etc/passwd' }} [bold]x[/]\"", StringComparison.Ordinal)),
        HostileCase.Audit("departure-pattern", Site.Good + $"departures:\n  - {{ rule: '{new string('a', 1000)}', subject: '{Site.Times(1000, "*a")}', reason: x, agreed-by: y, date: 2026-01-01 }}\n"),
        HostileCase.Audit("date-that-is-none", Site.Good + "departures:\n  - { rule: a, subject: A, reason: x, agreed-by: y, date: 2026-02-30 }\n"),
    ];
}
