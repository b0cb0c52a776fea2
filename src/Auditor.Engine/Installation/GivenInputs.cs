using Auditor.Documents;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Installation;

/// <summary>The inputs that a design gives of one subject, packed: most of those that the schema allows are not given.</summary>
/// <param name="slots">How many inputs the kind of subject has.</param>
internal sealed class GivenInputs(int slots)
{
    private const int First = 16;

    /// <summary>For each slot the place among what is given, counted from 1; 0 where it is not given.</summary>
    private readonly ushort[] _places = new ushort[slots];
    private Node?[] _nodes = new Node[First];
    private Value[] _values = new Value[First];
    private int _count;

    /// <summary>Whether an input is given.</summary>
    public bool Has(int slot) => _places[slot] != 0;

    /// <summary>The node that gives an input; null where none does.</summary>
    public Node? Node(int slot) => _places[slot] == 0 ? null : _nodes[_places[slot] - 1];

    /// <summary>The value of an input that is given.</summary>
    public Value Value(int slot) => _values[_places[slot] - 1];

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
