using System.Collections.Immutable;
using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Installation;

/// <summary>A subject of a design: its place in the tree, its mapping in the design file, and what has been computed for it.</summary>
public sealed class DesignSubject : ISubject
{
    private readonly Design _design;

    /// <summary>By slot number, blank until computed; null until one is asked for: a design with faults, or one that is only imported, is never evaluated.</summary>
    private Value[]? _quantities;
    private GivenInputs? _inputs;

    internal DesignSubject(Design design, SubjectShape shape, string key, MappingNode node, Evaluator evaluator)
    {
        _design = design;
        Shape = shape;
        Key = key;
        Node = node;
        Evaluator = evaluator;
        Scope = new Scope(this, null, null);
    }

    /// <inheritdoc/>
    public SubjectShape Shape { get; }

    /// <inheritdoc/>
    public string Key { get; }

    /// <summary>The mapping that describes it.</summary>
    public MappingNode Node { get; }

    /// <summary>Where it is named, or where its mapping begins.</summary>
    public SourceSpan Place => (Node.Find("id") ?? Node.Find("to") ?? Node.Find("rule"))?.Span ?? (Node.Entries.Count == 0 ? Node.Span : Node.Span.Slice(0, 1));

    /// <inheritdoc/>
    public Scope Scope { get; }

    /// <summary>The subject on the side of the origin; null for the installation.</summary>
    public DesignSubject? Parent { get; internal set; }

    /// <summary>The board that a circuit feeds, if any.</summary>
    public DesignSubject? FedBoard { get; internal set; }

    internal Evaluator Evaluator { get; }

    /// <summary>What the design gives of it; read when it is first asked for, once the tree of subjects stands.</summary>
    private GivenInputs Inputs => _inputs ??= _design.InputsOf(this);

    /// <summary>Place among all subjects of the design.</summary>
    internal int Index { get; init; }

    /// <summary>The legs of a circuit's cable run; empty for any other subject.</summary>
    public IReadOnlyList<DesignSubject> Legs => Shape.Collection("legs") is { } legs ? Collections[legs.Index] : [];

    internal DesignSubject Installation => _design.Installation;

    internal List<IReadOnlyList<DesignSubject>> Collections { get; } = [];

    /// <summary>What the audit itself knows of a subject on record, by the name of the input; empty for a part of the installation.</summary>
    internal IReadOnlyDictionary<string, Value> Told { get; init; } = ImmutableDictionary<string, Value>.Empty;

    /// <inheritdoc/>
    public Value Input(int slot) => Inputs.Has(slot) ? Inputs.Value(slot) : Value.NotGiven(this, slot);

    /// <inheritdoc/>
    /// <remarks>Threads may ask for the same quantity at once: they compute the same value, and it does not matter whose is kept.</remarks>
    public Value Quantity(int slot)
    {
        var values = _quantities ?? Interlocked.CompareExchange(ref _quantities, new Value[Shape.Quantities.Count], null) ?? _quantities;
        var value = Value.Take(ref values[slot]);
        if (value.IsBlank)
        {
            value = Evaluator.Compute(Shape, slot, Scope);
            Value.Put(ref values[slot], value);
        }

        return value;
    }

    /// <inheritdoc/>
    public Value Parameter(int slot) => Evaluator.Parameter(slot);

    /// <inheritdoc/>
    public ISubject? Go(int way) => way switch
    {
        Shapes.Up => Parent,
        Shapes.Origin => _design.Installation,
        _ => FedBoard,
    };

    /// <inheritdoc/>
    public IReadOnlyList<ISubject> Collection(int index) => Collections[index];

    /// <summary>The mappings of this subject whose <c>type</c> names an entry of <c>types</c>, with the list that it is in.</summary>
    internal IEnumerable<(MappingNode Holder, string List)> NamedHolders() => _design.NamedHolders(this);

    /// <summary>The node that gives an input, wherever it stands: a scalar, a list or a group; null when the design does not give it.</summary>
    public Node? Statement(InputSlot slot) => Inputs.Node(slot.Index);

    /// <summary>The scalar in the design file that gives an input, wherever it stands; null when the design does not give it.</summary>
    public ScalarNode? Source(InputSlot slot) => Statement(slot) as ScalarNode;
}
