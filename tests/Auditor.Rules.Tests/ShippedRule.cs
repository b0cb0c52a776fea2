using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Engine.RuleTests;

namespace Auditor.Rules.Tests;

/// <summary>The rules of the United Kingdom set, which holds those of the base as well, and what their cases come to.</summary>
internal static class ShippedRule
{
    public static RuleSet Set => Shipped.Set(Shipped.UnitedKingdom);

    public static CaseRunner Runner { get; } = new(Set, new Problems());

    /// <summary>One row of a theory for each rule.</summary>
    public static IEnumerable<TheoryDataRow<string>> Rows(string what) =>
        Set.Rules.Select(rule => new TheoryDataRow<string>(rule.Id) { TestDisplayName = $"{what} · {rule.Id}" });

    public static Rule Of(string id) => Set.Rules.Single(rule => rule.Id == id);

    public static IEnumerable<Verdict?> Verdicts(Rule rule) => Runner.Judgements(rule).Select(judgement => judgement.Verdict);

    public static bool Measures(Rule rule) => rule.Check.How is CheckKind.AtMost or CheckKind.AtLeast or CheckKind.Within;

    public static IEnumerable<MappingNode> Cases(Rule rule) => rule.Node.Mappings("cases");
}
