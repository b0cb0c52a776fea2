using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.Installation;

/// <summary>An installation as its design file describes it: the tree of subjects, ready to be evaluated.</summary>
public sealed class Design
{
    private readonly DesignSchema _schema;
    private readonly MappingNode? _types;

    internal Design(DesignFile file, Evaluator evaluator)
    {
        File = file;
        _schema = evaluator.Rules.Schema;
        _types = file.Root.Mapping("types");
        Installation = new DesignSubject(this, _schema.Shapes.Installation, "-", file.Root, evaluator);
        Evaluator = evaluator;
    }

    /// <summary>The file it was read from.</summary>
    public DesignFile File { get; }

    /// <summary>The installation as a subject.</summary>
    public DesignSubject Installation { get; }

    /// <summary>All subjects in the order of the design: the installation, its bonding conductors, then board by board with circuits and legs.</summary>
    public IReadOnlyList<DesignSubject> Subjects { get; internal set; } = [];

    /// <summary>The rule set and its parameters.</summary>
    public Evaluator Evaluator { get; }

    /// <summary>The subject of that key, or null.</summary>
    public DesignSubject? Find(string key) => Subjects.FirstOrDefault(subject => subject.Key == key);

    /// <summary>The node that gives an input: the subject's own, its named type's, or for a leg its board's default; null for none.</summary>
    internal Node? Find(DesignSubject subject, InputSlot slot)
    {
        if (_schema.PlaceOf(subject.Shape, slot.Index) is not { } place)
        {
            return null;
        }

        return Walk(subject.Node, place.Keys, 0) ?? InType(subject, place) ?? InDefaults(subject, place);
    }

    internal IEnumerable<(MappingNode Holder, string List)> NamedHolders(DesignSubject subject) =>
        _schema.NamedGroups(subject.Shape)
            .Select(group => (Walk(subject.Node, group.Keys, 0) as MappingNode, group.List))
            .Where(pair => pair.Item1 is not null)
            .Select(pair => (pair.Item1!, pair.List));

    internal Value ReadInput(DesignSubject subject, InputSlot slot)
    {
        var node = Find(subject, slot);
        return (slot.Type.Kind, node) switch
        {
            (_, null) => BuiltIn(subject, slot),
            (FormulaKind.Group, MappingNode) => Value.Of(true),
            (FormulaKind.Quantity, ScalarNode scalar) => Number(subject, slot, scalar),
            (FormulaKind.Text, ScalarNode scalar) => Value.Of(scalar.Text),
            (FormulaKind.Flag, ScalarNode { Kind: ScalarKind.Flag } scalar) => Value.Of(scalar.Flag),
            (FormulaKind.Words, SequenceNode list) => Value.Of([.. list.Items.OfType<ScalarNode>().Select(item => item.Text)]),
            _ => Absent(subject, slot),
        };
    }

    private static Value Number(DesignSubject subject, InputSlot slot, ScalarNode scalar)
    {
        if (scalar.Kind == ScalarKind.Number && slot.Type.Dimension.IsNone)
        {
            return Value.Of(scalar.Number);
        }

        return QuantityText.TryParse(scalar.Text, out var stated, out _) && stated.Quantity.Dimension == slot.Type.Dimension
            ? Value.Of(stated.Quantity.Value, stated.Standing == Standing.Assumed ? Marks.Assumed : Marks.None)
            : Absent(subject, slot);
    }

    private static Value BuiltIn(DesignSubject subject, InputSlot slot) => slot.Name switch
    {
        Shapes.Key => Value.Of(subject.Key),
        Shapes.FeedsBoard => Value.Of(subject.FedBoard is not null),
        Shapes.IsRoot => Value.Of(subject.Parent is { Parent: null }),
        _ => subject.Told.TryGetValue(slot.Name, out var told) ? told : Absent(subject, slot),
    };

    private static Value Absent(DesignSubject subject, InputSlot slot) =>
        Value.Missing(new Absence(AbsenceKind.Input, subject.Key, slot.Path, $"`{slot.Path}` is not given", ""));

    private Node? InType(DesignSubject subject, InputPlace place)
    {
        if (place.Types is null)
        {
            return null;
        }

        var holder = Walk(subject.Node, place.Keys.Take(place.NamedAt).ToList(), 0) as MappingNode;
        var entry = holder?.Text("type") is { } name ? _types?.Mapping(place.Types)?.Mapping(name) : null;
        return entry is null ? null : Walk(entry, place.Keys, place.NamedAt);
    }

    private Node? InDefaults(DesignSubject subject, InputPlace place) =>
        subject.Shape == _schema.Shapes.Leg && subject.Parent?.Parent?.Node.Mapping("defaults") is { } defaults
            ? Walk(defaults, place.Keys, 0)
            : null;

    private static Node? Walk(MappingNode start, IReadOnlyList<string> keys, int from)
    {
        Node? node = start;
        for (var i = from; i < keys.Count; i++)
        {
            node = (node as MappingNode)?.Find(keys[i]);
        }

        return node;
    }
}
