using Auditor.Documents;
using Auditor.Engine.Adjustments;
using Auditor.Engine.Installation;
using Auditor.Formulas;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;

namespace Auditor.Engine.RuleSets;

/// <summary>Reads the adjustments of a set.</summary>
/// <param name="shapes">Kinds of subject, with their quantities.</param>
/// <param name="world">Tables, curves and parameters.</param>
/// <param name="problems">Receives what is wrong.</param>
internal sealed class AdjustmentReader(Shapes shapes, FormulaWorld world, Problems problems)
{
    private readonly LadderReader _ladders = new(world, problems);

    /// <summary>The adjustment of a file, or null with problems added.</summary>
    public Adjustment? Read(RuleFile file)
    {
        var node = file.Root;
        var shape = shapes.Find(node.Text("of")!)!;
        if (Input(node.Scalar("input")!, shape) is not { } slot || _ladders.Read(node, shape, slot) is not { } ladder)
        {
            return null;
        }

        var expect = Formula(node, "expect", shape, slot.Type);
        var exists = Formula(node, "exists", shape, FormulaType.Flag);
        var remedy = node.Mapping("remedy") is { } terms ? new RemedyTermsReader(_ladders).Read(terms, slot) : null;
        if (remedy is null && node.Find("remedy") is not null)
        {
            return null;
        }

        if (Also(node, shape) is not { } also || (expect is null && node.Find("expect") is not null) || (exists is null && node.Find("exists") is not null))
        {
            return null;
        }

        return new Adjustment
        {
            Id = node.Text("adjustment")!,
            Label = node.Text("label")!,
            Shape = shape,
            Slot = slot,
            Ladder = ladder,
            Also = also,
            Exists = exists,
            AllLegs = node.Text("legs") == "all",
            IsReading = node.Scalar("reading") is { Flag: true },
            IsForSite = node.Scalar("on-site") is { Flag: true },
            Expect = expect,
            HasLimits = node.Scalar("limits") is not { Flag: false },
            Remedy = remedy,
            Node = node,
        };
    }

    private Formula? Formula(MappingNode node, string key, SubjectShape shape, FormulaType type) =>
        node.Scalar(key) is { } formula ? FormulaBinder.Bind(formula, shape, world, type, problems) : null;

    private InputSlot? Input(ScalarNode path, SubjectShape shape)
    {
        var slot = shape.Input(path.Text.Replace('-', '_'));
        if (slot is null)
        {
            problems.Add(RuleMessages.NoReading(path.Span, path.Text, shape.Name, NearestWord.Find(path.Text, shape.Inputs.Select(input => input.Path))));
        }
        else if (slot.Type.Kind is not (FormulaKind.Quantity or FormulaKind.Text))
        {
            problems.Add(RuleMessages.NotAdjustable(path.Span, path.Text, slot.Type));
            slot = null;
        }

        return slot;
    }

    private List<(InputSlot Slot, Formula Formula)>? Also(MappingNode node, SubjectShape shape)
    {
        var also = new List<(InputSlot, Formula)>();
        foreach (var entry in node.Mapping("also")?.Entries ?? [])
        {
            var path = new ScalarNode(entry.Key.Span, entry.Key.Value, ScalarKind.Text);
            if (Input(path, shape) is not { } slot || FormulaBinder.Bind((ScalarNode)entry.Value, shape, world, slot.Type, problems) is not { } formula)
            {
                return null;
            }

            also.Add((slot, formula));
        }

        return also;
    }
}
