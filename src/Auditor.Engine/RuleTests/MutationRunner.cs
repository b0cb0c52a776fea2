using Auditor.Documents;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.RuleTests;

/// <summary>
/// Changes every rule of a set, and every comparison in the formulas of its quantities, in small ways one at a time, and
/// runs the cases of what was changed. A change that all cases survive shows that a case is wanting.
/// </summary>
/// <param name="rules">The rule set; all its cases pass.</param>
public sealed class MutationRunner(RuleSet rules)
{
    private readonly CaseRunner _cases = new(rules, new Problems());

    /// <summary>Makes every change, side by side.</summary>
    public MutationReport Run()
    {
        var quantities = rules.Quantities.Where(quantity => IsTried(quantity.Node)).ToArray();
        var all = rules.AllRules.Where(rule => IsTried(rule.Node)).ToArray();
        var reports = new MutationReport[all.Length + quantities.Length];
        Parallel.For(0, reports.Length, i => reports[i] = i < all.Length ? Run(all[i]) : Run(quantities[i - all.Length]));
        return Together(reports);
    }

    /// <summary>Of a house set its own files alone: the others are tried with the set that they belong to.</summary>
    private bool IsTried(MappingNode node) => rules.HouseFiles.Count == 0 || rules.HouseFiles.Contains(node.Span.Source.Path);

    /// <summary>Changes one rule.</summary>
    public MutationReport Run(Rule rule) =>
        Report(new RuleMutator(rule, rules, _cases).All().Select(pair => (pair.Mutation, _cases.Run(pair.Changed))));

    /// <summary>Changes the comparisons in the formula of one quantity.</summary>
    public MutationReport Run(QuantityDefinition quantity) =>
        Report(new FormulaMutator(quantity.Shape, rules.World).Turned(quantity.Formula).Select(mutant =>
            (new Mutation(CaseRunner.OwnerOf(quantity), mutant.Span, mutant.Change), _cases.Run(quantity with { Formula = mutant.Formula }))));

    private static MutationReport Report(IEnumerable<(Mutation Mutation, IEnumerable<CaseResult> Results)> tries)
    {
        var count = 0;
        var survivors = new List<Mutation>();
        foreach (var (mutation, results) in tries)
        {
            count++;
            if (results.All(result => result.Failure is null))
            {
                survivors.Add(mutation);
            }
        }

        return new MutationReport(count, survivors);
    }

    private static MutationReport Together(IReadOnlyList<MutationReport> reports) => new(
        reports.Sum(report => report.Count),
        [.. reports.SelectMany(report => report.Survivors).OrderBy(mutation => mutation.Span.Source.Path, StringComparer.Ordinal)
            .ThenBy(mutation => mutation.Span.Start).ThenBy(mutation => mutation.Change, StringComparer.Ordinal)]);
}
