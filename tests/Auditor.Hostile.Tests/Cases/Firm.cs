namespace Auditor.Hostile.Tests.Cases;

/// <summary>A small rule set of a firm beside a design that asks for it, as a pull request may bring it.</summary>
internal static class Firm
{
    /// <summary>The folders that a set may use, none of which has to be there.</summary>
    public const string Set = """
        set: firm
        title: Firm
        uses: { sheets: [sheets], provisions: [provisions] }

        """;

    /// <summary>A rule that compares a formula of a circuit with 5.</summary>
    public static string Rule(string formula, string says = "{{ value }} against {{ limit }}.") => $$"""
        rule: at-most-five
        title: It is at most five
        clause: { type: overload, references: [Firm 1] }
        provision: requirement
        status: { since: 1.0 }
        of: circuit
        compare: { value: {{Quoted(formula)}}, at-most: 5 }
        says: {{Quoted(says)}}
        why: None.
        departures: allowed
        cases:
          - { name: x, given: {}, verdict: undetermined }
        """;

    /// <summary>A sheet of quantities of a circuit, each with its formula.</summary>
    public static string Sheet(IEnumerable<(string Symbol, string Formula)> quantities) =>
        "sheet: firm\nabout: Figures of the firm.\nquantities:\n" + string.Concat(quantities.Select(quantity => $$"""
              - symbol: {{quantity.Symbol}}
                name: {{quantity.Symbol}}
                of: circuit
                unit: "1"
                formula: {{Quoted(quantity.Formula)}}
                clause: { type: plausibility }
                cases: [{ name: x, given: {}, expect: 1 }]

            """));

    /// <summary>A design beside the set of the firm.</summary>
    public static HostileFolder With(this HostileFolder folder, string set = Set) =>
        folder.Write("site.design.yaml", "rule-set: firm/firm.yaml\n" + Site.Good).Write("firm/firm.yaml", set);

    /// <summary>An audit by a set of one rule that compares a formula.</summary>
    public static HostileCase Formula(string name, string formula) =>
        HostileCase.Audit(name, folder => folder.With().Write("firm/sheets/none.txt", "").Write("firm/provisions/at-most-five.yaml", Rule(formula)));

    private static string Quoted(string text) => $"\"{text.Replace("\\", "\\\\", StringComparison.Ordinal).Replace("\"", "\\\"", StringComparison.Ordinal)}\"";
}
