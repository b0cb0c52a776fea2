using Auditor.Engine.Findings;
using Auditor.Engine.Variation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Adjustments;

/// <summary>A design in which one adjustment is made. One thread at a time may use it.</summary>
public sealed class AdjustedDesign
{
    private readonly Variant _variant;
    private readonly int _inputsOfHolder;

    /// <summary>Makes a design that as yet differs in nothing.</summary>
    public AdjustedDesign(DependencyMap map, Adjustable adjustable)
    {
        Adjustable = adjustable;
        _variant = new Variant(map, adjustable.Inputs);
        _inputsOfHolder = adjustable.Inputs.Count / adjustable.Holders.Count;
        Rules = adjustable.Inputs.Count == 1
            ? map.ReachOf(adjustable.Inputs[0]).Rules
            : [.. adjustable.Inputs.SelectMany(input => map.ReachOf(input).Rules).Distinct()
                .OrderBy(at => at.Subject.Index).ThenBy(at => at.Rule.Id, StringComparer.Ordinal)];
    }

    /// <summary>What is adjusted.</summary>
    public Adjustable Adjustable { get; }

    /// <summary>The rules that may come out otherwise, in the order of findings.</summary>
    public IReadOnlyList<RuleAt> Rules { get; }

    /// <summary>Makes the adjustment; with the stated value the design is as it was.</summary>
    public void Set(in Value value)
    {
        var isStated = Adjustable.Same(value, Adjustable.Stated);
        for (var holder = 0; holder < Adjustable.Holders.Count; holder++)
        {
            var first = holder * _inputsOfHolder;
            for (var i = 0; i < _inputsOfHolder; i++)
            {
                _variant.Reset(first + i);
            }

            if (!isStated)
            {
                _variant.Set(first, value);
                Follow(first, _variant.Of(Adjustable.Holders[holder]));
            }
        }
    }

    /// <summary>The steps of a ladder that there are, the stated one always among them; null where every value between two bounds may be taken.</summary>
    public IReadOnlyList<Value>? Steps()
    {
        var exists = Adjustable.Adjustment.Exists;
        if (Adjustable.Steps() is not { } steps || exists is null)
        {
            return Adjustable.Steps();
        }

        var stated = Adjustable.Stated;
        var there = steps.Where(step =>
        {
            Set(step);
            return Adjustable.Same(step, stated) || Adjustable.Holders.All(holder => exists.Evaluate(_variant.Of(holder).Scope).IsTrue);
        }).ToArray();
        Set(stated);
        return there;
    }

    /// <summary>Judges a rule.</summary>
    public Judgement Judge(RuleAt at) => _variant.Judge(at);

    /// <summary>A quantity of a subject with the adjustment made.</summary>
    internal Value Quantity(RuleSets.QuantityDefinition quantity, Installation.DesignSubject subject) => _variant.Of(subject).Quantity(quantity.Slot.Index);

    private void Follow(int first, ISubject holder)
    {
        var also = Adjustable.Adjustment.Also;
        var values = also.Select(each => each.Formula.Evaluate(holder.Scope)).ToArray();
        for (var i = 0; i < values.Length; i++)
        {
            if (!values[i].IsMissing)
            {
                _variant.Set(first + 1 + i, values[i]);
            }
        }
    }
}
