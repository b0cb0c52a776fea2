using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Formulas;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Engine.RuleTests;

/// <summary>
/// Changes one rule in every small way: comparisons turned, limits shifted, its condition or a part of it dropped.
/// </summary>
/// <param name="rule">The rule.</param>
/// <param name="rules">Its rule set.</param>
/// <param name="runner">Runs its cases, to see which limits are counts.</param>
internal sealed class RuleMutator(Rule rule, RuleSet rules, CaseRunner runner)
{
    private readonly FormulaMutator _formulas = new(rule.Shape, rules.World);

    /// <summary>The changed rules, each with its change.</summary>
    public IEnumerable<(Rule Changed, Mutation Mutation)> All() =>
        [.. Comparison(), .. Dropped(), .. InWhen(), .. InValue(), .. InLimits()];

    private IEnumerable<(Rule, Mutation)> Comparison()
    {
        var (from, to, how) = rule.Check.How switch
        {
            CheckKind.AtMost => ("at-most", "at-least", CheckKind.AtLeast),
            CheckKind.AtLeast => ("at-least", "at-most", CheckKind.AtMost),
            _ => ("", "", rule.Check.How),
        };
        return how == rule.Check.How
            ? []
            : [(With(rule.Check with { How = how }), Change(rule.Check.Limits[0].Source.Span, MutationMessages.Turned(from, to)))];
    }

    private IEnumerable<(Rule, Mutation)> Dropped()
    {
        if (rule.When is not { } when)
        {
            yield break;
        }

        yield return (rule with { When = null }, Change(when.Source.Span, MutationMessages.ConditionDropped));
        var parts = FormulaOutline.Conjuncts(when.Text);
        foreach (var part in parts.Where(_ => parts.Count > 1))
        {
            var rest = string.Join(" && ", parts.Where(other => other != part).Select(other => other.Text));
            if (_formulas.Rewritten(when, rest, part, MutationMessages.PartDropped) is { } mutant)
            {
                yield return (rule with { When = mutant.Formula }, Change(mutant.Span, mutant.Change));
            }
        }
    }

    private IEnumerable<(Rule, Mutation)> InWhen() =>
        rule.When is { } when ? InFormula(when, changed => rule with { When = changed }) : [];

    private IEnumerable<(Rule, Mutation)> InValue() =>
        InFormula(rule.Check.Value, changed => With(rule.Check with { Value = changed }));

    private IEnumerable<(Rule, Mutation)> InLimits()
    {
        var isCount = new Lazy<bool>(ComparesCounts);
        for (var i = 0; i < rule.Check.Limits.Count; i++)
        {
            var (limit, index) = (rule.Check.Limits[i], i);
            var shifted = IsMeasured(limit) ? _formulas.Shifted(limit, isCount.Value) : [];
            foreach (var mutant in shifted)
            {
                yield return (WithLimit(index, mutant.Formula), Change(mutant.Span, mutant.Change));
            }

            foreach (var change in InFormula(limit, changed => WithLimit(index, changed)))
            {
                yield return change;
            }
        }
    }

    private bool IsMeasured(Formula limit) =>
        limit.Type.Kind == FormulaKind.Quantity && rule.Check.How is CheckKind.AtMost or CheckKind.AtLeast or CheckKind.Within;

    private Rule WithLimit(int index, Formula changed) =>
        With(rule.Check with { Limits = [.. rule.Check.Limits.Select((limit, i) => i == index ? changed : limit)] });

    private Rule With(Check check) => rule with { Check = check };

    private IEnumerable<(Rule, Mutation)> InFormula(Formula formula, Func<Formula, Rule> change) =>
        _formulas.Turned(formula).Concat(_formulas.Shifted(formula, IsCount))
            .Select(mutant => (change(mutant.Formula), Change(mutant.Span, mutant.Change)));

    /// <summary>Whether the rule compares counts: a pure number that is whole in every case, value and limit alike.</summary>
    private bool ComparesCounts() =>
        rule.Check.Value.Type.Dimension.IsNone
        && AreWhole(runner.Judgements(rule).SelectMany(judgement => judgement.Limits.Append(judgement.Value)));

    /// <summary>
    /// Whether an operand counts something: a bare whole number, or a pure number that is whole in every case. What is written
    /// in percent is a share, and operands inside an aggregate belong to other subjects.
    /// </summary>
    private bool IsCount(string operand) =>
        operand.All(char.IsAsciiDigit)
        || (!operand.Contains("percent", StringComparison.Ordinal)
            && _formulas.Bind(operand, FormulaType.Number) is { } formula
            && AreWhole(rule.Node.Mappings("cases").Select(node => runner.Evaluate(formula, rule.Shape, node.Mapping("given")))));

    private static bool AreWhole(IEnumerable<Value> values)
    {
        var numbers = values.Where(value => value.Kind == ValueKind.Quantity).Select(value => value.Number).ToArray();
        return numbers.Length > 0 && Array.TrueForAll(numbers, number => number == Math.Round(number));
    }

    private Mutation Change(SourceSpan span, string change) => new(rule.Id, span, change);
}
