using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.RuleTests;

/// <summary>A subject made up for a case: what the case gives stands, everything else is computed or missing.</summary>
/// <param name="shape">Kind of subject.</param>
/// <param name="key">Name in messages.</param>
/// <param name="world">The world of the case.</param>
internal sealed class CaseSubject(SubjectShape shape, string key, CaseWorld world) : ISubject
{
    private readonly Dictionary<int, Value> _inputs = [];
    private readonly Dictionary<int, Value> _quantities = [];
    private readonly Dictionary<int, List<CaseSubject>> _collections = [];
    private readonly Dictionary<string, CaseSubject> _ways = [];
    private readonly HashSet<int> _open = [];
    private Scope? _scope;

    public SubjectShape Shape { get; } = shape;

    public string Key { get; } = key;

    public Scope Scope => _scope ??= new Scope(this, null, null);

    public Value Input(int slot)
    {
        if (_inputs.TryGetValue(slot, out var given))
        {
            return given;
        }

        var input = Shape.Inputs[slot];
        return input.Name switch
        {
            Installation.Shapes.Key => Value.Of(Key),
            Installation.Shapes.FeedsBoard => Value.Of(_ways.ContainsKey("fed")),
            _ => Value.NotGiven(this, slot),
        };
    }

    public Value Quantity(int slot)
    {
        if (_quantities.TryGetValue(slot, out var known))
        {
            return known;
        }

        if (!_open.Add(slot))
        {
            return Value.Missing(new Absence(AbsenceKind.NotFinite, Key, Shape.Quantities[slot].Symbol, "the calculation runs in a circle", ""));
        }

        var value = world.Evaluator.Compute(Shape, slot, Scope);
        _quantities[slot] = value;
        return value;
    }

    public Value Parameter(int slot) => world.Parameters.TryGetValue(slot, out var given) ? given : world.Evaluator.Parameter(slot);

    public ISubject? Go(int way)
    {
        var name = Shape.Ways.First(candidate => candidate.Index == way).Name;
        return name switch
        {
            "origin" => world.Origin,
            "up" => _ways.GetValueOrDefault(name) ?? Above(),
            _ => _ways.GetValueOrDefault(name),
        };
    }

    /// <summary>Every subject but the installation is somewhere: a leg of a circuit, a circuit on a board, a board at the origin.</summary>
    private CaseSubject? Above()
    {
        if (this == world.Origin)
        {
            return null;
        }

        var target = Shape.Way("up")!.Targets[^1];
        var above = target == world.Origin.Shape ? world.Origin : new CaseSubject(target, Key + ".up", world);
        _ways["up"] = above;
        return above;
    }

    public IReadOnlyList<ISubject> Collection(int index) => _collections.TryGetValue(index, out var list) ? list : [];

    public void Give(InputSlot slot, Value value) => _inputs[slot.Index] = value;

    public void Give(QuantitySlot slot, Value value) => _quantities[slot.Index] = value;

    public void Join(string way, CaseSubject subject) => _ways[way] = subject;

    public CaseSubject? At(string way) => _ways.GetValueOrDefault(way);

    public void Add(SubjectList list, CaseSubject item)
    {
        if (!_collections.TryGetValue(list.Index, out var items))
        {
            _collections.Add(list.Index, items = []);
        }

        items.Add(item);
    }
}
