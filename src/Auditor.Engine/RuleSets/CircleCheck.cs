using Auditor.Documents;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.RuleSets;

/// <summary>
/// Finds quantities that need one another. A chain that only ever looks up, or only ever looks down, ends at the origin or
/// at the loads; one that stays at a subject, or that looks up and down, can run in a circle and is refused.
/// </summary>
internal sealed class CircleCheck(QuantityDefinition[][] quantities, Problems problems)
{
    private readonly Dictionary<(int Shape, int Slot), State> _states = [];
    private readonly List<(QuantityDefinition Definition, Direction Into)> _path = [];

    private enum State
    {
        Open,
        Done,
    }

    public void Run()
    {
        foreach (var definition in quantities.SelectMany(list => list))
        {
            Visit(definition, Direction.Same);
        }
    }

    private void Visit(QuantityDefinition? definition, Direction into)
    {
        if (definition is null)
        {
            return;
        }

        var key = (definition.Shape.Index, definition.Slot.Index);
        if (_states.TryGetValue(key, out var state))
        {
            if (state == State.Open)
            {
                Judge(definition, into);
            }

            return;
        }

        _states[key] = State.Open;
        _path.Add((definition, into));
        foreach (var (shape, slot, direction) in QuantitiesOf(definition.Formula))
        {
            Visit(quantities[shape.Index][slot.Index], direction);
        }

        _path.RemoveAt(_path.Count - 1);
        _states[key] = State.Done;
    }

    private static IEnumerable<(SubjectShape Shape, QuantitySlot Slot, Direction Direction)> QuantitiesOf(Formula formula) =>
        formula.References
            .Where(reference => reference.Quantity is not null)
            .Select(reference => (reference.Shape, reference.Quantity!, reference.Direction))
            .Distinct();

    private void Judge(QuantityDefinition definition, Direction closing)
    {
        var start = _path.FindIndex(step => step.Definition == definition);
        var loop = _path.Skip(start).ToArray();
        var directions = loop.Skip(1).Aggregate(closing, (all, step) => all | step.Into);
        if (directions is Direction.Up or Direction.Down)
        {
            return;
        }

        var names = loop.Select(step => $"{step.Definition.Shape.Name} {step.Definition.Slot.Symbol}").Append($"{definition.Shape.Name} {definition.Slot.Symbol}");
        problems.Add(RuleMessages.Circle(definition.Formula.Source.Span, string.Join(" → ", names)));
    }
}
