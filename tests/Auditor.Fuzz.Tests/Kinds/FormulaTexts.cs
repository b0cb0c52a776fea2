using System.Text;
using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Formulas.Binding;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>
/// Formulas of the shipped sheets and rules and hostile ones, each after the kind of subject that it is of: <c>circuit: Zs * Ib</c>.
/// They are bound, and evaluated at a few subjects of a design.
/// </summary>
internal sealed class FormulaTexts : FuzzKind
{
    private const string Hostile = """
        circuit: ((((((((((((((((((((((((((((((((((((((((((((((((((1))))))))))))))))))))))))))))))))))))))))))))))))))
        circuit: 9 ^ 9 ^ 9 ^ 9 ^ 9
        circuit: 1e308 * 1e308 - 1e308 * 1e308
        circuit: 0 / 0 == 0 / 0
        circuit: sqrt(0 - 1) ^ 0.5
        circuit: matches(name ?? 'aaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaa', '(a|a)*b')
        circuit: 1 - 1 + 1 - 1 + 1 - 1 + 1 - 1 + 1 - 1 + 1 - 1 + 1 - 1 + 1 - 1 + 1 - 1 + 1 - 1
        installation: sum_of(boards, sum_of(circuits, sum_of(legs, length)))
        """;

    private readonly Dictionary<string, DesignSubject[]> _subjects = Corpus.Design("examples/boatyard/boatyard.design.yaml", Corpus.Rules).Subjects
        .GroupBy(subject => subject.Shape.Name).ToDictionary(group => group.Key, group => group.Take(2).Append(group.Last()).ToArray());

    public override IReadOnlyList<byte[]> Seeds { get; } =
    [
        .. Corpus.Rules.Quantities.Select(quantity => $"{quantity.Shape.Name}: {quantity.Formula.Text}")
            .Concat(Corpus.Rules.AllRules.Where(rule => rule.When is not null).Select(rule => $"{rule.Shape.Name}: {rule.When!.Text}"))
            .Concat(Hostile.Split('\n')).Distinct(StringComparer.Ordinal).Order(StringComparer.Ordinal).Select(Encoding.UTF8.GetBytes),
    ];

    public override Judgement Judge(byte[] input)
    {
        var source = new SourceText("formula", Encoding.UTF8.GetString(input));
        var colon = source.Text.IndexOf(':') + 1;
        var subjects = _subjects.GetValueOrDefault(colon == 0 ? "" : source.Text[..(colon - 1)]) ?? _subjects["circuit"];
        var problems = new Problems();
        var scalar = new ScalarNode(source.WholeSpan().Slice(colon, source.Text.Length - colon), source.Text[colon..], ScalarKind.Text);
        var formula = FormulaBinder.Bind(scalar, subjects[0].Shape, Corpus.Rules.World, null, problems);
        var isBound = formula is not null && !problems.HasErrors;
        return isBound && !subjects.All(subject => IsWhole(formula!.Evaluate(subject.Scope)))
            ? Judgement.Neither
            : Judged(isBound, problems);
    }
}
