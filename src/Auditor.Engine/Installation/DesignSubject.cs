using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Installation;

/// <summary>A subject of a design: its place in the tree, its mapping in the design file, and what has been computed for it.</summary>
public sealed class DesignSubject : ISubject
{
    private readonly Design _design;

    // Made when the first value is asked for: a design with faults, or one that is only imported, is never evaluated.
    private Value[] _quantities = [];
    private bool[] _known = [];
    private bool[] _open = [];
    private Value[] _inputs = [];
    private bool[] _read = [];

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

    /// <summary>Place among all subjects of the design.</summary>
    internal int Index { get; init; }

    /// <summary>The legs of a circuit's cable run; empty for any other subject.</summary>
    public IReadOnlyList<DesignSubject> Legs => Shape.Collection("legs") is { } legs ? Collections[legs.Index] : [];

    internal DesignSubject Installation => _design.Installation;

    internal List<IReadOnlyList<DesignSubject>> Collections { get; } = [];

    /// <summary>What the audit itself knows of a subject on record, by the name of the input; empty for a part of the installation.</summary>
    internal IReadOnlyDictionary<string, Value> Told { get; init; } = new Dictionary<string, Value>();

    /// <inheritdoc/>
    public Value Input(int slot)
    {
        if (slot >= _read.Length)
        {
            _inputs = new Value[Shape.Inputs.Count];
            _read = new bool[Shape.Inputs.Count];
        }

        if (!_read[slot])
        {
            _inputs[slot] = _design.ReadInput(this, Shape.Inputs[slot]);
            _read[slot] = true;
        }

        return _inputs[slot];
    }

    /// <inheritdoc/>
    public Value Quantity(int slot)
    {
        if (slot >= _known.Length)
        {
            _quantities = new Value[Shape.Quantities.Count];
            _known = new bool[Shape.Quantities.Count];
            _open = new bool[Shape.Quantities.Count];
        }

        if (_known[slot])
        {
            return _quantities[slot];
        }

        if (_open[slot])
        {
            return InCircle(Key, Shape.Quantities[slot]);
        }

        _open[slot] = true;
        _quantities[slot] = Evaluator.Compute(Shape, slot, Scope);
        _known[slot] = true;
        return _quantities[slot];
    }

    /// <summary>What stands for a quantity that turns out to need itself.</summary>
    internal static Value InCircle(string subject, QuantitySlot slot) =>
        Value.Missing(new Absence(AbsenceKind.NotFinite, subject, slot.Symbol, "the calculation runs in a circle", ""));

    /// <summary>Reads every input and computes every quantity, so that from then on any number of threads may read this subject.</summary>
    internal void Settle()
    {
        for (var slot = 0; slot < Shape.Inputs.Count; slot++)
        {
            Input(slot);
        }

        for (var slot = 0; slot < Shape.Quantities.Count; slot++)
        {
            Quantity(slot);
        }
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

    /// <summary>The value in the design file that gives an input, wherever it stands; null when the design does not give it.</summary>
    public Node? Statement(InputSlot slot) => _design.Find(this, slot);

    /// <summary>The scalar in the design file that gives an input, wherever it stands; null when the design does not give it.</summary>
    public ScalarNode? Source(InputSlot slot) => Statement(slot) as ScalarNode;

    /// <summary>The node that gives an input, wherever it stands: a scalar, a list or a group; null when the design does not give it.</summary>
    internal Node? Given(InputSlot slot) => _design.Find(this, slot);
}
