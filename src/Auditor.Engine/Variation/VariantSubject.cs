using System.Numerics;
using Auditor.Engine.Installation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Variation;

/// <summary>A subject of a design as it is in a variant.</summary>
internal sealed class VariantSubject : ISubject
{
    private const int BitsOfWord = 64;

    private readonly DesignSubject _base;
    private readonly Variant _variant;
    private readonly ulong[]? _reached;
    private readonly Value[] _quantities;
    private readonly int[] _stamps;
    private readonly List<(int Slot, Value Value)> _overrides = [];
    private VariantSubject[]?[]? _collections;

    /// <summary>Makes the subject of a variant.</summary>
    /// <param name="subject">The subject in the design.</param>
    /// <param name="variant">The variant.</param>
    /// <param name="reached">One bit for each quantity that the changes may reach; null for none.</param>
    public VariantSubject(DesignSubject subject, Variant variant, ulong[]? reached)
    {
        _base = subject;
        _variant = variant;
        _reached = reached;
        _quantities = reached is null ? [] : new Value[subject.Shape.Quantities.Count];
        _stamps = reached is null ? [] : new int[subject.Shape.Quantities.Count];
        Scope = new Scope(this, null, null);
    }

    public SubjectShape Shape => _base.Shape;

    public string Key => _base.Key;

    public Scope Scope { get; }

    public Value Input(int slot)
    {
        foreach (var (overridden, value) in _overrides)
        {
            if (overridden == slot)
            {
                return value;
            }
        }

        return _base.Input(slot);
    }

    public Value Quantity(int slot)
    {
        if (_reached is null || (_reached[slot / BitsOfWord] & (1UL << (slot % BitsOfWord))) == 0)
        {
            return _base.Quantity(slot);
        }

        // A stamp is the generation in which the quantity was computed; 0 once it is forgotten.
        if (_stamps[slot] != _variant.Generation)
        {
            _quantities[slot] = _base.Evaluator.Compute(Shape, slot, Scope);
            _stamps[slot] = _variant.Generation;
        }

        return _quantities[slot];
    }

    public Value Parameter(int slot) => _base.Parameter(slot);

    public ISubject? Go(int way) => _base.Go(way) is DesignSubject target ? _variant.At(target) : null;

    public IReadOnlyList<ISubject> Collection(int index)
    {
        _collections ??= new VariantSubject[_base.Shape.Collections.Count][];
        return _collections[index] ??= [.. _base.Collection(index).Select(item => _variant.At((DesignSubject)item))];
    }

    /// <summary>Forgets the quantities that a change reaches.</summary>
    /// <param name="quantities">One bit for each quantity.</param>
    public void Forget(ulong[] quantities)
    {
        for (var word = 0; word < quantities.Length; word++)
        {
            for (var bits = quantities[word]; bits != 0; bits &= bits - 1)
            {
                _stamps[(word * BitsOfWord) + BitOperations.TrailingZeroCount(bits)] = 0;
            }
        }
    }

    public void Override(int slot, in Value value)
    {
        Restore(slot);
        _overrides.Add((slot, value));
    }

    public void Restore(int slot) => _overrides.RemoveAll(entry => entry.Slot == slot);
}
