using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;

namespace Auditor.Rules.Tests;

/// <summary>Which rules can come out undetermined.</summary>
internal static class Presence
{
    /// <summary>Whether some case of the rule would be undetermined if it gave one thing less.</summary>
    public static bool CanBeMissing(Rule rule) =>
        ShippedRule.Cases(rule).Select(node => node.Mapping("given")).OfType<MappingNode>().SelectMany(WithOneLess)
            .Any(given => ShippedRule.Runner.Judge(rule, given).Verdict == Verdict.Undetermined);

    private static IEnumerable<MappingNode> WithOneLess(MappingNode given) =>
        given.Entries.Select(entry => new MappingNode(given.Span, [.. given.Entries.Where(other => other != entry)]));
}
