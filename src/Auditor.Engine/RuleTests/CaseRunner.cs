using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.RuleTests;

/// <summary>Runs the cases that stand in sheets and rules.</summary>
/// <param name="rules">The rule set.</param>
/// <param name="problems">Receives cases that cannot be run as written.</param>
public sealed class CaseRunner(RuleSet rules, Problems problems)
{
    private readonly Evaluator _evaluator = new(rules);

    /// <summary>Runs every case of the set: sheets by kind of subject and slot, then rules by id.</summary>
    public IReadOnlyList<CaseResult> RunAll() => [.. rules.Quantities.SelectMany(Run), .. rules.Rules.SelectMany(Run)];

    /// <summary>Runs the cases of a quantity.</summary>
    public IEnumerable<CaseResult> Run(QuantityDefinition quantity) =>
        quantity.Node.Mappings("cases").Select(node => Run(quantity, node));

    /// <summary>Runs the cases of a rule.</summary>
    public IEnumerable<CaseResult> Run(Rule rule) => rule.Node.Mappings("cases").Select(node => Run(rule, node));

    private CaseResult Run(QuantityDefinition quantity, MappingNode node)
    {
        var subject = new CaseReader(rules, _evaluator, problems).Read(quantity.Shape, node.Mapping("given"));
        var value = quantity.Formula.Evaluate(subject.Scope);
        var failure = Compare(value, node.Scalar("expect")!, quantity.Slot.Type, quantity.Slot.Unit);
        return Result($"{quantity.Sheet}: {quantity.Shape.Name} {quantity.Slot.Symbol}", node, failure);
    }

    private CaseResult Run(Rule rule, MappingNode node)
    {
        var subject = new CaseReader(rules, _evaluator, problems).Read(rule.Shape, node.Mapping("given"));
        var judgement = Judge.Decide(rule, subject.Scope);
        var expected = node.Text("verdict");
        var got = judgement.Verdict?.Word() ?? "none";
        var failure = expected == got ? CompareMargin(judgement, node.Scalar("margin")) : $"expected {expected}, got {got}{Details(judgement)}";
        return Result(rule.Id, node, failure);
    }

    private static string Details(Judgement judgement) =>
        judgement.Absences is { } absences ? " (" + string.Join("; ", absences.Items) + ")" : "";

    private static CaseResult Result(string owner, MappingNode node, string? failure) => new(owner, node.Text("name")!, failure, node.Span);

    private static string? CompareMargin(Judgement judgement, ScalarNode? expected)
    {
        if (expected is null)
        {
            return null;
        }

        if (!QuantityText.TryParse(expected.Text, out var stated, out _) || !stated.Quantity.Dimension.IsNone)
        {
            return $"`{expected.Text}` is no relative margin";
        }

        if (judgement.Margin?.Relative is not { } relative)
        {
            return $"expected a margin of {expected.Text}, got none";
        }

        return Near(relative, stated) ? null : $"expected a margin of {expected.Text}, got {relative * 100:0.######} %";
    }

    private string? Compare(in Value value, ScalarNode expected, FormulaType type, Unit? unit)
    {
        if (expected.Text == "missing" || value.IsMissing)
        {
            return value.IsMissing == (expected.Text == "missing") ? null : $"expected {expected.Text}, got {Show(value, unit)}";
        }

        if (type.Kind != FormulaKind.Quantity)
        {
            var same = CaseReader.ValueOf(expected, type) is { } wanted
                && (type.Kind == FormulaKind.Text ? wanted.Text == value.Text : wanted.Flag == value.Flag);
            return same ? null : $"expected {expected.Text}, got {Show(value, unit)}";
        }

        if (!QuantityText.TryParse(expected.Text, out var stated, out _) || stated.Quantity.Dimension != type.Dimension)
        {
            problems.Add(CaseMessages.WrongExpectation(expected.Span, type));
            return $"`{expected.Text}` is no expectation for {type}";
        }

        return Near(value.Number, stated) ? null : $"expected {expected.Text}, got {Show(value, unit)}";
    }

    /// <summary>Within the tolerance, or the same within the slack of comparisons where none is stated.</summary>
    private static bool Near(double value, StatedQuantity stated)
    {
        var wanted = stated.Quantity.Value;
        if (Comparison.Same(value, wanted) || Math.Abs(value - wanted) < 1e-12)
        {
            return true;
        }

        return stated.Tolerance is { } tolerance && value >= wanted - tolerance.Below && value <= wanted + tolerance.Above;
    }

    private static string Show(in Value value, Unit? unit) => value.Kind switch
    {
        ValueKind.Missing => "missing: " + string.Join("; ", value.Absences.Items),
        ValueKind.Quantity => $"{unit!.FromCoherent(value.Number):G7} {unit.Symbol}",
        ValueKind.Flag => value.Flag ? "true" : "false",
        _ => value.Text,
    };
}
