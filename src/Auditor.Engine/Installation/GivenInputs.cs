using Auditor.Documents;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Installation;

/// <summary>The inputs that a design gives of one subject, packed: most of those that the schema allows are not given.</summary>
internal sealed class GivenInputs
{
    /// <summary>For each slot the place among what is given, counted from 1; 0 where it is not given.</summary>
    private readonly ushort[] _places;
    private readonly Node?[] _nodes;
    private readonly Value[] _values;

    /// <summary>Packs what was gathered.</summary>
    /// <param name="places">For each slot the place among what is given, counted from 1; 0 where it is not given.</param>
    /// <param name="nodes">The node at each place; null where none gives it.</param>
    /// <param name="values">The value at each place.</param>
    public GivenInputs(ushort[] places, ReadOnlySpan<Node?> nodes, ReadOnlySpan<Value> values)
    {
        _places = places;
        _nodes = nodes.ToArray();
        _values = values.ToArray();
    }

    /// <summary>Whether an input is given.</summary>
    public bool Has(int slot) => _places[slot] != 0;

    /// <summary>The node that gives an input; null where none does.</summary>
    public Node? Node(int slot) => _places[slot] == 0 ? null : _nodes[_places[slot] - 1];

    /// <summary>The value of an input that is given.</summary>
    public Value Value(int slot) => _values[_places[slot] - 1];
}
