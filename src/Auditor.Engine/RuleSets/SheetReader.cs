using Auditor.Documents;
using Auditor.Engine.HouseSets;
using Auditor.Engine.Installation;
using Auditor.Formulas;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Quantities;

namespace Auditor.Engine.RuleSets;

/// <summary>Declares the quantities of all sheets first, then binds their formulas, so that sheets may use one another in any order.</summary>
/// <param name="shapes">Kinds of subject; receive the quantities.</param>
/// <param name="changes">Receives what house sets change.</param>
/// <param name="problems">Receives what is wrong.</param>
internal sealed class SheetReader(Shapes shapes, HouseChanges changes, Problems problems)
{
    private readonly Dictionary<(SubjectShape, string), Declared> _declared = [];
    private readonly UncertaintyReader _uncertainties = new(problems);

    /// <summary>Declares the quantities of a sheet.</summary>
    /// <param name="file">The sheet's file.</param>
    /// <param name="set">Number of its set in the chain; a later set may define a quantity anew.</param>
    public void Declare(RuleFile file, int set)
    {
        foreach (var node in file.Root.Mappings("quantities"))
        {
            var symbol = node.Scalar("symbol")!;
            var shape = shapes.Find(node.Text("of")!)!;
            if (TypeOf(node) is not var (type, unit))
            {
                continue;
            }

            var earlier = _declared.GetValueOrDefault((shape, symbol.Text));
            if (earlier is null && shape.AddQuantity(symbol.Text, type, unit))
            {
                _declared.Add((shape, symbol.Text), new Declared(shape, shape.Quantity(symbol.Text)!, node, file.Root.Text("sheet")!, set));
            }
            else if (earlier is not null && earlier.Set < set && earlier.Slot.Type.Equals(type))
            {
                changes.Add(
                    set, HouseChangeKind.Quantity, $"{shape.Name} {symbol.Text}", (earlier.Node.Span.Source.Path, file.Path), loosens: true,
                    "computed by a formula of its own", symbol.Span);
                _declared[(shape, symbol.Text)] = earlier with { Node = node, Sheet = file.Root.Text("sheet")!, Set = set };
            }
            else
            {
                var other = earlier is null ? "an input of the design" : "defined at " + earlier.Node.Find("symbol")!.Span;
                problems.Add(RuleMessages.SecondSymbol(symbol.Span, symbol.Text, shape.Name, other));
            }
        }
    }

    /// <summary>Binds all formulas; a quantity whose formula has a problem is left out.</summary>
    public QuantityDefinition[][] Bind(FormulaWorld world)
    {
        var all = shapes.All.Select(shape => new QuantityDefinition[shape.Quantities.Count]).ToArray();
        foreach (var declared in _declared.Values)
        {
            var formula = FormulaBinder.Bind(declared.Node.Scalar("formula")!, declared.Shape, world, declared.Slot.Type, problems);
            if (formula is not null)
            {
                all[declared.Shape.Index][declared.Slot.Index] = Define(declared, formula);
            }
        }

        return all;
    }

    private QuantityDefinition Define(Declared declared, Formula formula) => new(
        declared.Shape, declared.Slot, declared.Node.Text("name")!, formula, ClauseReader.Read(declared.Node), declared.Node.Text("note") ?? "", declared.Sheet, declared.Node)
    {
        Uncertainty = _uncertainties.Read(declared.Node, declared.Shape, declared.Slot),
    };

    private (FormulaType Type, Unit? Unit)? TypeOf(MappingNode node)
    {
        var unitText = node.Scalar("unit");
        var gives = node.Text("gives");
        if (unitText is null == gives is null)
        {
            problems.Add(RuleMessages.UnitOrGives(node.Find("symbol")!.Span));
            return null;
        }

        if (unitText is null)
        {
            return (gives == "flag" ? FormulaType.Flag : FormulaType.Text, null);
        }

        if (UnitCatalog.Find(unitText.Text) is { } unit)
        {
            return (FormulaType.Of(unit.Dimension), unit);
        }

        problems.Add(RuleMessages.UnknownUnit(unitText.Span, unitText.Text));
        return null;
    }

    private sealed record Declared(SubjectShape Shape, QuantitySlot Slot, MappingNode Node, string Sheet, int Set);
}
