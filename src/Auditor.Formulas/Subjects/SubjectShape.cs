using Auditor.Formulas.Types;
using Auditor.Quantities;

namespace Auditor.Formulas.Subjects;

/// <summary>
/// What formulas may name at one kind of subject: its inputs, quantities, ways and collections.
/// Filled while schema and sheets are read, then only read.
/// </summary>
/// <param name="name">Kind of subject, as sheets and rules write it after <c>of:</c>.</param>
/// <param name="index">Number of the shape within its rule set.</param>
public sealed class SubjectShape(string name, int index)
{
    private readonly Dictionary<string, InputSlot> _inputs = [];
    private readonly Dictionary<string, QuantitySlot> _quantities = [];
    private readonly Dictionary<string, Way> _ways = [];
    private readonly Dictionary<string, SubjectList> _collections = [];
    private readonly List<InputSlot> _inputList = [];
    private readonly List<QuantitySlot> _quantityList = [];

    /// <summary>Kind of subject.</summary>
    public string Name { get; } = name;

    /// <summary>Number of the shape within its rule set.</summary>
    public int Index { get; } = index;

    /// <summary>All inputs, by slot number.</summary>
    public IReadOnlyList<InputSlot> Inputs => _inputList;

    /// <summary>All quantities, by slot number.</summary>
    public IReadOnlyList<QuantitySlot> Quantities => _quantityList;

    /// <summary>All ways.</summary>
    public IReadOnlyCollection<Way> Ways => _ways.Values;

    /// <summary>All collections.</summary>
    public IReadOnlyCollection<SubjectList> Collections => _collections.Values;

    /// <summary>The input of that name, or null.</summary>
    public InputSlot? Input(string inputName) => _inputs.GetValueOrDefault(inputName);

    /// <summary>The quantity of that symbol, or null.</summary>
    public QuantitySlot? Quantity(string symbol) => _quantities.GetValueOrDefault(symbol);

    /// <summary>The way of that name, or null.</summary>
    public Way? Way(string wayName) => _ways.GetValueOrDefault(wayName);

    /// <summary>The collection of that name, or null.</summary>
    public SubjectList? Collection(string collectionName) => _collections.GetValueOrDefault(collectionName);

    /// <summary>Adds an input; false when the name is taken.</summary>
    public bool AddInput(string path, FormulaType type, Unit? unit)
    {
        var slot = new InputSlot(path.Replace('-', '_'), path, _inputList.Count, type, unit);
        return _inputs.TryAdd(slot.Name, slot) && Kept(_inputList, slot);
    }

    /// <summary>Adds a quantity; false when its symbol is taken by a quantity or an input.</summary>
    public bool AddQuantity(string symbol, FormulaType type, Unit? unit)
    {
        var slot = new QuantitySlot(symbol, _quantityList.Count, type, unit);
        return !_inputs.ContainsKey(symbol) && _quantities.TryAdd(symbol, slot) && Kept(_quantityList, slot);
    }

    /// <summary>Adds a way.</summary>
    public void AddWay(string wayName, Direction direction, IReadOnlyList<SubjectShape> targets, string whenNone) =>
        _ways.Add(wayName, new Way(wayName, _ways.Count, direction, targets, whenNone));

    /// <summary>Adds a collection.</summary>
    public void AddCollection(string collectionName, SubjectShape items) =>
        _collections.Add(collectionName, new SubjectList(collectionName, _collections.Count, items));

    /// <summary>Every name that a formula may use at this shape, for suggestions.</summary>
    public IEnumerable<string> AllNames() =>
        _quantities.Keys.Concat(_inputs.Keys).Concat(_ways.Keys).Concat(_collections.Keys);

    private static bool Kept<T>(List<T> list, T slot)
    {
        list.Add(slot);
        return true;
    }
}
