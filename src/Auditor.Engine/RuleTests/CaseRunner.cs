using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.RuleTests;

/// <summary>Runs the cases that stand in sheets and rules. May be used side by side.</summary>
/// <param name="rules">The rule set.</param>
/// <param name="problems">Receives cases that cannot be run as written.</param>
public sealed class CaseRunner(RuleSet rules, Problems problems)
{
    private readonly CaseReader _reader = new(rules, new Evaluator(rules), problems);
    private readonly Expectation _expectation = new(problems);

    /// <summary>Runs every case of the set: sheets by kind of subject and slot, then rules by id, then the rules about the record.</summary>
    public IReadOnlyList<CaseResult> RunAll() => [.. rules.Quantities.SelectMany(Run), .. rules.AllRules.SelectMany(Run)];

    /// <summary>Runs the cases of a quantity.</summary>
    public IEnumerable<CaseResult> Run(QuantityDefinition quantity) => quantity.Node.Mappings("cases").Select(node => Run(quantity, node));

    /// <summary>Runs the cases of a rule.</summary>
    public IEnumerable<CaseResult> Run(Rule rule) => rule.Node.Mappings("cases").Select(node => Run(rule, node));

    /// <summary>Runs a case on a quantity.</summary>
    /// <param name="quantity">The quantity.</param>
    /// <param name="node">The case: <c>name</c>, <c>given</c> and <c>expect</c>, in a form that the schema of sheets accepts.</param>
    public CaseResult Run(QuantityDefinition quantity, MappingNode node)
    {
        var value = Evaluate(quantity.Formula, quantity.Shape, node.Mapping("given"));
        var failure = _expectation.Compare(value, node.Scalar("expect")!, quantity.Slot.Type, quantity.Slot.Unit);
        return Result(OwnerOf(quantity), node, failure);
    }

    /// <summary>Runs a case on a rule.</summary>
    /// <param name="rule">The rule.</param>
    /// <param name="node">The case: <c>name</c>, <c>given</c>, <c>verdict</c> and <c>margin</c>, in a form that the schema of rules accepts.</param>
    public CaseResult Run(Rule rule, MappingNode node)
    {
        var judgement = Judge(rule, node.Mapping("given"));
        var expected = node.Text("verdict");
        var got = judgement.Verdict?.Word() ?? "none";
        var failure = expected == got ? Expectation.Compare(judgement.Margin, node.Scalar("margin")) : $"expected {expected}, got {got}{Details(judgement)}";
        return Result(rule.Id, node, failure);
    }

    /// <summary>What each case of a rule comes to, in their order.</summary>
    public IEnumerable<Judgement> Judgements(Rule rule) => rule.Node.Mappings("cases").Select(node => Judge(rule, node.Mapping("given")));

    /// <summary>What a rule comes to on the subject that a case describes.</summary>
    /// <param name="rule">The rule.</param>
    /// <param name="given">What the case gives; null for nothing.</param>
    public Judgement Judge(Rule rule, MappingNode? given) => Evaluation.Judge.Decide(rule, _reader.Read(rule.Shape, given, IsOfHouse(rule.Node)).Scope);

    /// <summary>The value of a formula on the subject that a case describes.</summary>
    /// <param name="formula">The formula.</param>
    /// <param name="shape">Kind of subject that it was bound for.</param>
    /// <param name="given">What the case gives; null for nothing.</param>
    public Value Evaluate(Formula formula, SubjectShape shape, MappingNode? given) =>
        formula.Evaluate(_reader.Read(shape, given, given is not null && IsOfHouse(given)).Scope);

    private bool IsOfHouse(MappingNode node) => rules.HouseFiles.Contains(node.Span.Source.Path);

    /// <summary>How results and messages call a quantity.</summary>
    internal static string OwnerOf(QuantityDefinition quantity) => $"{quantity.Sheet}: {quantity.Shape.Name} {quantity.Slot.Symbol}";

    private static string Details(Judgement judgement) =>
        judgement.Absences is { } absences ? " (" + string.Join("; ", absences.Items) + ")" : "";

    private static CaseResult Result(string owner, MappingNode node, string? failure) => new(owner, node.Text("name")!, failure, node.Span);
}
