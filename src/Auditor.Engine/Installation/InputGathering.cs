using Auditor.Documents;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Installation;

/// <summary>Gathers the inputs that a design gives of one subject. One after the other can be gathered: what is packed is a copy.</summary>
internal sealed class InputGathering
{
    private const int First = 64;

    private ushort[] _places = [];
    private Node?[] _nodes = new Node[First];
    private Value[] _values = new Value[First];
    private int _count;

    /// <summary>Begins with a subject.</summary>
    /// <param name="slots">How many inputs its kind has.</param>
    public void Begin(int slots)
    {
        _places = new ushort[slots];
        _count = 0;
    }

    /// <summary>Takes a node for an input, unless one nearer to the subject gave it already.</summary>
    public void Add(int slot, Node node)
    {
        if (_places[slot] == 0)
        {
            Put(slot, node, default);
        }
    }

    /// <summary>Sets the value of an input that no node gives.</summary>
    public void Set(int slot, in Value value) => Put(slot, null, value);

    /// <summary>Works out the values of the nodes taken.</summary>
    /// <param name="read">Gives the value of a node for a slot.</param>
    public void Settle(Func<int, Node, Value> read)
    {
        for (var slot = 0; slot < _places.Length; slot++)
        {
            if (_places[slot] is var place and not 0 && _nodes[place - 1] is { } node)
            {
                _values[place - 1] = read(slot, node);
            }
        }
    }

    /// <summary>What was gathered.</summary>
    public GivenInputs Packed() => new(_places, _nodes.AsSpan(0, _count), _values.AsSpan(0, _count));

    private void Put(int slot, Node? node, in Value value)
    {
        if (_count == _nodes.Length)
        {
            Array.Resize(ref _nodes, 2 * _count);
            Array.Resize(ref _values, 2 * _count);
        }

        _nodes[_count] = node;
        _values[_count] = value;
        _places[slot] = checked((ushort)++_count);
    }
}
