using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Tests.Changes;

/// <summary>
/// Made-up rules of cable runs with what can be changed of them. The rule <c>thin</c> allows 10.2 m for each mm²: 15.3 m of 1.5 mm², 25.5 m of 2.5 mm²,
/// 40.8 m of 4 mm².
/// </summary>
internal static class Runs
{
    public const string Thin = "compare: { value: length / csa * (1 mm2), at-most: 10.2 m }\nput-right-by: [csa]\n";

    public const string Length = "of: leg\ninput: length\nrange: { from: 0.5 m, to: 100 m }\nremedy: { effort: 8, way: down, share: 50 %, round: 0.5 m }\n";

    public const string Size = "of: leg\ninput: csa\nsteps: [1.5 mm², 2.5 mm², 4 mm², 6 mm²]\nremedy: { effort: 3, way: up, most: 2 }\n";

    /// <summary>A design with one circuit of so many metres of a size.</summary>
    public static string Design(string length, string csa = "1.5 mm²", string more = "") =>
        "design-format: 1\nsupply: { earthing: TN-S, phases: 1, voltage: 230 V }\n" + more
        + $"boards:\n  - id: A\n    circuits:\n      - {{ id: 1, load: {{ current: 9 A }}, cable: {{ csa: {csa}, length: {length} }} }}\n";

    /// <summary>A set of rules of legs and of adjustments, each by its name and the lines that make it up.</summary>
    public static RuleSet Set(IEnumerable<(string Id, string Text)> rules, params (string Id, string Text)[] adjustments)
    {
        using var made = new TemporaryRules().With("set.yaml", "set: set\ntitle: Set\nuses: { provisions: [rules], adjustments: [adjustments] }\n");
        foreach (var (id, text) in rules)
        {
            var body = (text.Contains("provision:", StringComparison.Ordinal) ? "" : "provision: requirement\n")
                + (text.StartsWith("of:", StringComparison.Ordinal) ? "" : "of: leg\n") + text;
            made.With(
                $"rules/{id}.yaml",
                $"rule: {id}\ntitle: A rule\nclause: {{ type: plausibility }}\nstatus: {{ since: 1.0 }}\n{body}"
                + "says: Made.\nwhy: Made.\ndepartures: allowed\ncases: [{ name: one, verdict: undetermined }]\n");
        }

        foreach (var (id, text) in adjustments)
        {
            made.With($"adjustments/{id}.yaml", $"adjustment: {id}\nlabel: {id}\nabout: Made.\n{text}");
        }

        return made.LoadSound("set.yaml");
    }

    /// <summary>Builds a design with a set.</summary>
    public static Design Build(string design, RuleSet rules) => Small.Build(design, rules);

    /// <summary>Audits a design with a set.</summary>
    public static AuditResult Audit(string design, RuleSet rules, Decision decision = Decision.Simple) =>
        Evaluation.Audit.Run(Build(design, rules), Small.Today, new Problems(), new Acceptance(decision));
}
