using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Engine.Variation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Adjustments;

/// <summary>A design in which one or more adjustments are made. One thread at a time may use it.</summary>
public sealed class AdjustedDesign
{
    private readonly Variant _variant;
    private readonly int[] _first;
    private IReadOnlyList<RuleAt>? _rules;

    /// <summary>Makes a design that as yet differs in nothing.</summary>
    /// <param name="map">The map of the design.</param>
    /// <param name="places">What is adjusted. Where two of them change the same input, the later one counts.</param>
    public AdjustedDesign(DependencyMap map, params IReadOnlyList<Adjustable> places)
    {
        Map = map;
        Places = places;
        _variant = new Variant(map, [.. places.SelectMany(place => place.Inputs)]);
        _first = [.. places.Select((_, i) => places.Take(i).Sum(place => place.Inputs.Count))];
    }

    /// <summary>The map of the design as it is.</summary>
    public DependencyMap Map { get; }

    /// <summary>What is adjusted.</summary>
    public IReadOnlyList<Adjustable> Places { get; }

    /// <summary>The rules that may come out otherwise, in the order of findings.</summary>
    public IReadOnlyList<RuleAt> Rules => _rules ??= _variant.Inputs.Count == 1
        ? Map.ReachOf(_variant.Inputs[0]).Rules
        : [.. _variant.Inputs.SelectMany(input => Map.ReachOf(input).Rules).Distinct()
            .OrderBy(at => at.Subject.Index).ThenBy(at => at.Rule.Id, StringComparer.Ordinal)];

    /// <summary>Makes the adjustments, in the order of the places; with its stated value a place is as it was.</summary>
    public void Set(params ReadOnlySpan<Value> values)
    {
        for (var input = 0; input < _variant.Inputs.Count; input++)
        {
            _variant.Reset(input);
        }

        for (var place = 0; place < values.Length; place++)
        {
            if (!Adjustable.Same(values[place], Places[place].Stated))
            {
                Set(place, values[place]);
            }
        }
    }

    /// <summary>The steps of a place's ladder that there are, the stated one always among them; null where every value between two bounds may be taken.</summary>
    public IReadOnlyList<Value>? Steps(int place = 0)
    {
        var (adjustable, exists) = (Places[place], Places[place].Adjustment.Exists);
        if (adjustable.Steps() is not { } steps || exists is null)
        {
            return adjustable.Steps();
        }

        var stated = adjustable.Stated;
        var there = steps.Where(step =>
        {
            Set();
            Set(place, step);
            return Adjustable.Same(step, stated) || adjustable.Holders.All(holder => exists.Evaluate(_variant.Of(holder).Scope).IsTrue);
        }).ToArray();
        Set();
        return there;
    }

    /// <summary>Judges a rule.</summary>
    public Judgement Judge(RuleAt at) => _variant.Judge(at);

    /// <summary>The inputs that differ from the design, subject by subject.</summary>
    public IReadOnlyList<ChangedInput> Changes() =>
        [.. _variant.Inputs.Distinct()
            .Select(input => new ChangedInput(input, _variant.Of(input.Subject).Input(input.Slot.Index)))
            .Where(changed => !changed.After.IsMissing && !Adjustable.Same(changed.After, changed.Input.Stated))];

    /// <summary>A quantity of a subject with the adjustments made.</summary>
    internal Value Quantity(QuantityDefinition quantity, DesignSubject subject) => _variant.Of(subject).Quantity(quantity.Slot.Index);

    private void Set(int place, in Value value)
    {
        var holders = Places[place].Holders;
        var inputsOfHolder = Places[place].Inputs.Count / holders.Count;
        for (var holder = 0; holder < holders.Count; holder++)
        {
            var first = _first[place] + (holder * inputsOfHolder);
            _variant.Set(first, value);
            Follow(Places[place].Adjustment, first, _variant.Of(holders[holder]));
        }
    }

    private void Follow(Adjustment adjustment, int first, ISubject holder)
    {
        var values = adjustment.Also.Select(each => each.Formula.Evaluate(holder.Scope)).ToArray();
        for (var i = 0; i < values.Length; i++)
        {
            if (!values[i].IsMissing)
            {
                _variant.Set(first + 1 + i, values[i]);
            }
        }
    }
}
