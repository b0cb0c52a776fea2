using Auditor.Documents;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests.RuleTests;

/// <summary>A loop impedance down to the legs, made up so that cases can give any part of it and leave the rest to be computed.</summary>
internal static class MadeRules
{
    /// <summary>The text of a quantity with its cases.</summary>
    public static string Quantity(string symbol, string of, string gives, string formula, params string[] cases) =>
        $"  - symbol: {symbol}\n    name: made\n    of: {of}\n    {gives}\n    formula: {formula}\n    clause: {{ type: plausibility }}\n    cases:\n"
        + string.Concat(cases.DefaultIfEmpty("{ name: none, expect: missing }").Select(each => $"      - {each}\n"));

    /// <summary>The text of a rule of circuits with its cases.</summary>
    public static string Rule(string id, string body, params string[] cases) =>
        $"rule: {id}\ntitle: A rule\nclause: {{ type: plausibility }}\nprovision: requirement\nstatus: {{ since: 1.0 }}\nof: circuit\n{body}"
        + "says: Made.\nwhy: Made up for tests.\ndepartures: allowed\ncases:\n" + string.Concat(cases.Select(each => $"  - {each}\n"));

    /// <summary>A set of the loop quantities and some more, with rules by their texts.</summary>
    public static RuleSet Set(IEnumerable<string> quantities, params (string Id, string Text)[] rules)
    {
        using var made = new TemporaryRules()
            .With("set.yaml", $"set: set\ntitle: Set\nuses: {{ sheets: [sheet.yaml]{(rules.Length > 0 ? ", provisions: [rules]" : "")} }}\n"
                + "parameters: { extra: { value: 0 ohm, tighter: lower } }\n")
            .With("sheet.yaml", "sheet: made\nabout: Made for a test.\nquantities:\n"
                + Quantity("Zs", "installation", "unit: Ω", "supply.loop_impedance")
                + Quantity("Zdb", "board", "unit: Ω", "origin.Zs")
                + Quantity("R1", "leg", "unit: Ω", "1 mohm_per_m * length")
                + Quantity("demand", "board", "unit: A", "sum_of(circuits, Ib)", "{ name: two, given: { circuits: [{ Ib: 4 A }, { load.current: 6 A }] }, expect: 10 A }")
                + Quantity("Ib", "circuit", "unit: A", "choose(feeds_board, fed.demand, load.current)")
                + string.Concat(quantities));
        foreach (var (id, text) in rules)
        {
            made.With($"rules/{id}.yaml", text);
        }

        return made.LoadSound("set.yaml");
    }

    /// <summary>The loop impedance of a circuit, with its cases.</summary>
    public static string Loop(params string[] cases) => Quantity("Zt", "circuit", "unit: Ω", "up.Zdb + sum_of(legs, R1) + param.extra", cases);

    /// <summary>A node without the cases that it has.</summary>
    public static MappingNode WithoutCases(MappingNode node) => new(node.Span, [.. node.Entries.Where(entry => entry.Key.Value != "cases")]);
}
