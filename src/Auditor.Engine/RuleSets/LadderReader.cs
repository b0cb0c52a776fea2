using Auditor.Documents;
using Auditor.Engine.Adjustments;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.RuleSets;

/// <summary>Reads the values that an adjustable input may take.</summary>
internal sealed class LadderReader(FormulaWorld world, Problems problems)
{
    /// <summary>The ladder of an adjustment, or null with problems added.</summary>
    public Ladder? Read(MappingNode node, SubjectShape shape, InputSlot slot)
    {
        if (node.Mapping("range") is { } range)
        {
            return Range(range, slot);
        }

        return node.Mapping("series") is { } series ? Series(series, shape, slot) : Steps(node.Items("steps").OfType<ScalarNode>(), slot);
    }

    private RangeLadder? Range(MappingNode range, InputSlot slot)
    {
        var from = Step(range.Scalar("from")!, slot);
        var to = Step(range.Scalar("to")!, slot);
        if (from is null || to is null)
        {
            return null;
        }

        if (slot.Type.Kind == FormulaKind.Quantity && from.Value.Number < to.Value.Number)
        {
            return new RangeLadder(from.Value.Number, to.Value.Number);
        }

        problems.Add(RuleMessages.EmptyRange(range.Span));
        return null;
    }

    private SeriesLadder? Series(MappingNode series, SubjectShape shape, InputSlot slot)
    {
        var name = series.Scalar("lookup")!;
        if (!world.Lookups.TryGetValue(name.Text, out var lookup))
        {
            problems.Add(RuleMessages.NoLookup(name.Span, name.Text, NearestWord.Find(name.Text, world.Lookups.Keys)));
            return null;
        }

        var nodes = series.Items("keys").OfType<ScalarNode>().ToArray();
        if (nodes.Length != lookup.Keys.Count - 1 || lookup.Keys[^1].Unit?.Dimension != slot.Type.Dimension)
        {
            problems.Add(RuleMessages.NotSeries(series.Span, lookup.Name, lookup.Keys.Select(key => key.Name)));
            return null;
        }

        var keys = nodes.Select((key, i) => FormulaBinder.Bind(key, shape, world, TypeOf(lookup.Keys[i].Unit), problems)).ToArray();
        return Array.Exists(keys, key => key is null) ? null : new SeriesLadder(lookup, keys!);
    }

    private StepLadder? Steps(IEnumerable<ScalarNode> nodes, InputSlot slot)
    {
        var steps = nodes.Select(node => Step(node, slot)).ToArray();
        return Array.Exists(steps, step => step is null) ? null : new StepLadder([.. steps.Select(step => step!.Value)]);
    }

    /// <summary>One value of an input, or null with a problem added.</summary>
    public Value? Step(ScalarNode node, InputSlot slot)
    {
        var (type, _, value) = ParameterReader.Literal(node);
        if (!type.Equals(slot.Type))
        {
            problems.Add(RuleMessages.StepType(node.Span, slot.Path, slot.Type, type));
            return null;
        }

        if (slot.Type.Vocabulary is { } words && !words.Contains(value.Text))
        {
            problems.Add(RuleMessages.StepWord(node.Span, value.Text, slot.Path, words));
            return null;
        }

        return value;
    }

    private static FormulaType TypeOf(Unit? unit) => unit is null ? FormulaType.Text : FormulaType.Of(unit.Dimension);
}
