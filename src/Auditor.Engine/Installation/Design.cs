using System.Collections.Concurrent;
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
    /// <summary>Where a thread gathers the inputs of one subject after the other; null while it does.</summary>
    [ThreadStatic]
    private static InputGathering? _gathering;

    private readonly DesignSchema _schema;
    private readonly MappingNode? _types;

    /// <summary>What texts of quantities say: designs repeat them.</summary>
    private readonly ConcurrentDictionary<string, StatedQuantity?> _quantities = new(StringComparer.Ordinal);

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

    /// <summary>What the design gives of a subject: in the subject's own mapping, in a named type, or for a leg in its board's defaults.</summary>
    internal GivenInputs InputsOf(DesignSubject subject)
    {
        var tree = _schema.TreeOf(subject.Shape);
        var given = _gathering ?? new InputGathering();
        _gathering = null;
        given.Begin(subject.Shape.Inputs.Count);
        tree.Own(subject.Node, given);
        if (_types is not null)
        {
            tree.Named(subject.Node, _types, given);
        }

        if (subject.Shape == _schema.Shapes.Leg && subject.Parent?.Parent?.Node.Mapping("defaults") is { } defaults)
        {
            tree.Own(defaults, given);
        }

        given.Settle((slot, node) => ValueOf(subject, subject.Shape.Inputs[slot], node));
        foreach (var slot in _schema.BuiltIn(subject.Shape))
        {
            if (BuiltIn(subject, subject.Shape.Inputs[slot]) is { } value)
            {
                given.Set(slot, value);
            }
        }

        _gathering = given;
        return given.Packed();
    }

    /// <summary>What the text of a quantity says; null where it is none.</summary>
    internal StatedQuantity? Stated(string text) => _quantities.GetOrAdd(text, static text => QuantityText.TryParse(text, out var read, out _) ? read : null);

    internal IEnumerable<(MappingNode Holder, string List)> NamedHolders(DesignSubject subject) =>
        _schema.NamedGroups(subject.Shape)
            .Select(group => (Walk(subject.Node, group.Keys) as MappingNode, group.List))
            .Where(pair => pair.Item1 is not null)
            .Select(pair => (pair.Item1!, pair.List));

    private Value ValueOf(DesignSubject subject, InputSlot slot, Node node) => (slot.Type.Kind, node) switch
    {
        (FormulaKind.Group, MappingNode) => Value.Of(true),
        (FormulaKind.Quantity, ScalarNode scalar) => Number(subject, slot, scalar),
        (FormulaKind.Text, ScalarNode scalar) => Value.Of(scalar.Text),
        (FormulaKind.Flag, ScalarNode { Kind: ScalarKind.Flag } scalar) => Value.Of(scalar.Flag),
        (FormulaKind.Words, SequenceNode list) => Value.Of([.. list.Items.OfType<ScalarNode>().Select(item => item.Text)]),
        _ => Value.NotGiven(subject, slot.Index),
    };

    private Value Number(DesignSubject subject, InputSlot slot, ScalarNode scalar)
    {
        if (scalar.Kind == ScalarKind.Number && slot.Type.Dimension.IsNone)
        {
            return Value.Of(scalar.Number);
        }

        var stated = Stated(scalar.Text);
        return stated is not null && stated.Quantity.Dimension == slot.Type.Dimension
            ? Value.Of(stated.Quantity.Value, stated.Standing == Standing.Assumed ? Marks.Assumed : Marks.None)
            : Value.NotGiven(subject, slot.Index);
    }

    private static Value? BuiltIn(DesignSubject subject, InputSlot slot) => slot.Name switch
    {
        Shapes.Key => Value.Of(subject.Key),
        Shapes.FeedsBoard => Value.Of(subject.FedBoard is not null),
        Shapes.IsRoot => Value.Of(subject.Parent is { Parent: null }),
        _ => subject.Told.TryGetValue(slot.Name, out var told) ? told : null,
    };

    private static Node? Walk(MappingNode start, IReadOnlyList<string> keys)
    {
        Node? node = start;
        foreach (var key in keys)
        {
            node = (node as MappingNode)?.Find(key);
        }

        return node;
    }
}
