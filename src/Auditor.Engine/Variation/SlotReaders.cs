using Auditor.Engine.RuleSets;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.Variation;

/// <summary>Which formulas of a rule set read each input and each quantity.</summary>
internal sealed class SlotReaders
{
    private static readonly List<Reader> Nobody = [];

    private readonly List<Reader>?[][] _ofInputs;
    private readonly List<Reader>?[][] _ofQuantities;

    public SlotReaders(RuleSet rules)
    {
        var shapes = rules.Schema.Shapes.All;
        _ofInputs = [.. shapes.Select(shape => new List<Reader>?[shape.Inputs.Count])];
        _ofQuantities = [.. shapes.Select(shape => new List<Reader>?[shape.Quantities.Count])];
        foreach (var quantity in rules.Quantities)
        {
            Enter(quantity.Formula, quantity.Shape, quantity.Slot.Index, null);
        }

        foreach (var rule in rules.Rules)
        {
            foreach (var formula in FormulasOf(rule))
            {
                Enter(formula, rule.Shape, -1, rule);
            }
        }
    }

    public IReadOnlyList<Reader> OfInput(SubjectShape shape, int slot) => _ofInputs[shape.Index][slot] ?? Nobody;

    public IReadOnlyList<Reader> OfQuantity(SubjectShape shape, int slot) => _ofQuantities[shape.Index][slot] ?? Nobody;

    private static IEnumerable<Formula> FormulasOf(Rule rule) =>
        rule.Check.Limits.Prepend(rule.Check.Value).Concat(rule.When is { } when ? [when] : []);

    private void Enter(Formula formula, SubjectShape shape, int quantity, Rule? rule)
    {
        foreach (var reference in formula.References)
        {
            var readers = reference.Input is { } input
                ? _ofInputs[reference.Shape.Index][input.Index] ??= []
                : _ofQuantities[reference.Shape.Index][reference.Quantity!.Index] ??= [];
            readers.Add(new Reader(shape, quantity, rule, reference.Route));
        }
    }
}
