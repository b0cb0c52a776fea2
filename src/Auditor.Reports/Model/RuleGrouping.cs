using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Model;

/// <summary>Gathers findings by rule, what is gravest and tightest first.</summary>
internal static class RuleGrouping
{
    public static IReadOnlyList<RuleFindings> Of(IEnumerable<(Finding Finding, ReportFinding Shown)> findings) =>
        [.. findings
            .GroupBy(pair => pair.Finding.Rule)
            .Select(group => (Rule: group.Key, Pairs: group.OrderBy(pair => Need.Of(pair.Finding)).ToArray()))
            .OrderBy(group => Need.Of(group.Pairs[0].Finding))
            .ThenBy(group => group.Rule.Id, StringComparer.Ordinal)
            .Select(group => Of(group.Rule, group.Pairs))];

    private static RuleFindings Of(Rule rule, (Finding Finding, ReportFinding Shown)[] pairs)
    {
        var least = pairs.Select(pair => pair.Finding.Judgement.Margin?.Relative).Where(margin => margin is not null).Min();
        var counts = VerdictOrder.GravestFirst
            .Select(verdict => new RuleCount(verdict.Word(), pairs.Count(pair => pair.Finding.Verdict == verdict)))
            .Where(count => count.Total > 0);
        return new RuleFindings(
            rule.Id, rule.Title, rule.Provision == Provision.Requirement, rule.Clause.Type, rule.Clause.References, rule.Clause.Note, rule.Why,
            rule.PutRightBy, pairs[0].Finding.Verdict.Word(), least is { } margin ? ValueText.ShowMargin(margin) : "",
            [.. pairs.SelectMany(pair => pair.Shown.Formulas).Select(line => new FormulaDefinition(line.Role, line.Definition)).Distinct()], [.. counts],
            [.. pairs.Select(pair => pair.Shown)]);
    }
}
