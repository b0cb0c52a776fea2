using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Engine.RuleTests;
using Auditor.Formulas;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Types;

namespace Auditor.Rules.Tests;

/// <summary>Each condition that <c>when</c> of a rule joins by "and" and "or" must be seen both true and false by its cases.</summary>
public class ConditionTests
{
    public static IEnumerable<TheoryDataRow<string, string>> Conditions() =>
        from rule in ShippedRule.Set.Rules
        from part in FormulaOutline.Conditions(rule.When?.Text ?? "").Select(part => part.Text).Distinct()
        where part.Length > 0
        select new TheoryDataRow<string, string>(rule.Id, part) { TestDisplayName = $"condition · {rule.Id} · {part}" };

    [Theory]
    [MemberData(nameof(Conditions))]
    public void A_condition_is_seen_true_and_false(string id, string part)
    {
        var rule = ShippedRule.Of(id);
        var formula = Bind(rule, part);
        var values = ShippedRule.Cases(rule)
            .Select(node => ShippedRule.Runner.Evaluate(formula, rule.Shape, node.Mapping("given"))).ToArray();
        Assert.Contains(values, value => value.IsTrue);
        Assert.Contains(values, value => value.IsFalse);
    }

    private static Formula Bind(Rule rule, string text)
    {
        var problems = new Problems();
        var source = new SourceText("condition", text);
        var node = new ScalarNode(new SourceSpan(source, 0, text.Length), text, ScalarKind.Text);
        var formula = FormulaBinder.Bind(node, rule.Shape, ShippedRule.Set.World, FormulaType.Flag, problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return formula!;
    }
}
