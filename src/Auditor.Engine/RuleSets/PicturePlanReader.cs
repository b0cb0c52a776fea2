using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Quantities;

namespace Auditor.Engine.RuleSets;

/// <summary>Binds the plans of pictures.</summary>
/// <param name="shapes">Kinds of subject, with their quantities.</param>
/// <param name="world">Tables, curves and parameters.</param>
/// <param name="definitions">The quantities of the sheets, by kind of subject and slot; null where the formula has a problem of its own.</param>
/// <param name="problems">Receives what is wrong.</param>
internal sealed class PicturePlanReader(Shapes shapes, FormulaWorld world, QuantityDefinition?[][] definitions, Problems problems)
{
    /// <summary>What the axes of a kind of picture measure; a role that is not here may be anything.</summary>
    private static readonly Dictionary<(string Kind, string Role), FormulaType> Types = new()
    {
        [("single-line", "switch")] = FormulaType.Flag,
        [("single-line", "rcd")] = FormulaType.Flag,
        [("single-line", "transformer")] = FormulaType.Flag,
        [("single-line", "electrode")] = FormulaType.Flag,
        [("single-line", "source")] = FormulaType.Flag,
        [("single-line", "device")] = FormulaType.Text,
        [("single-line", "line")] = FormulaType.Text,
        [("single-line", "load")] = FormulaType.Words,
        [("profile", "along")] = FormulaType.Of(Dimension.Length),
        [("profile", "value")] = FormulaType.Number,
        [("profile", "limit")] = FormulaType.Number,
        [("time-current", "standard")] = FormulaType.Text,
        [("time-current", "type")] = FormulaType.Text,
        [("time-current", "rating")] = FormulaType.Of(Dimension.Current),
        [("time-current", "upstream-standard")] = FormulaType.Text,
        [("time-current", "upstream-type")] = FormulaType.Text,
        [("time-current", "upstream-rating")] = FormulaType.Of(Dimension.Current),
        [("time-current", "setting-least")] = FormulaType.Of(Dimension.Current),
        [("time-current", "setting-most")] = FormulaType.Of(Dimension.Current),
        [("time-current", "setting-time")] = FormulaType.Of(Dimension.Time),
        [("time-current", "withstand")] = FormulaType.Of(Dimension.JouleIntegral),
        [("time-current", "withstand-up-to")] = FormulaType.Of(Dimension.Time),
        [("time-current", "fault")] = FormulaType.Of(Dimension.Current),
        [("time-current", "time-limit")] = FormulaType.Of(Dimension.Time),
        [("balance", "line")] = FormulaType.Of(Dimension.Current),
        [("balance", "neutral")] = FormulaType.Of(Dimension.Current),
        [("balance", "conductors")] = FormulaType.Text,
        [("balance", "limit")] = FormulaType.Of(Dimension.Current),
        [("parts", "reading")] = FormulaType.Of(Dimension.Resistance),
        [("parts", "limit")] = FormulaType.Of(Dimension.Resistance),
    };

    private static readonly HashSet<string> Heads = ["picture", "title", "about", "place"];

    /// <summary>The plan of a file; what cannot be bound is left out, with problems added.</summary>
    public PicturePlan Read(RuleFile file)
    {
        var kind = file.Root.Entries.First(entry => !Heads.Contains(entry.Key.Value));
        var settings = (MappingNode)kind.Value;
        var quantities = shapes.All.SelectMany(shape => Quantities(kind.Key.Value, shape, settings)).ToArray();
        return new PicturePlan(
            file.Root.Text("picture")!, kind.Key.Value, file.Root.Text("title")!, file.Root.Text("about")!, (int)((ScalarNode)file.Root.Find("place")!).Number,
            quantities, settings, file.Root);
    }

    private IEnumerable<PlannedQuantity> Quantities(string kind, SubjectShape shape, MappingNode settings) =>
        from role in settings.Mapping(shape.Name)?.Entries ?? []
        from node in settings.Mapping(shape.Name)!.Items(role.Key.Value)
        let quantity = Bind(kind, shape, role.Key.Value, node)
        where quantity is not null
        select quantity;

    private PlannedQuantity? Bind(string kind, SubjectShape shape, string role, Node node)
    {
        var source = node as ScalarNode ?? ((MappingNode)node).Scalar("formula")!;
        if (FormulaBinder.Bind(source, shape, world, Types.GetValueOrDefault((kind, role)), problems) is not { } formula)
        {
            return null;
        }

        var label = (node as MappingNode)?.Text("label");
        return new PlannedQuantity(shape, role, label ?? Name(shape, formula.Text) ?? formula.Text, formula, label is not null);
    }

    /// <summary>A bare symbol goes by the name that its sheet gives it, an input by its own.</summary>
    private string? Name(SubjectShape shape, string text) => shape.Quantity(text) is { } slot
        ? definitions[shape.Index][slot.Index]?.Name
        : shape.Input(text)?.Path.Replace('.', ' ').Replace('-', ' ');
}
