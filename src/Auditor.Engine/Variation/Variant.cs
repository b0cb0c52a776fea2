using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Variation;

/// <summary>
/// A design with some inputs changed. Nothing of the design itself changes; only what the changed inputs have a part in is computed
/// anew, everything else is read from the design. One thread at a time may use a variant; a design may have many.
/// </summary>
public sealed class Variant
{
    /// <summary>Up to so many quantities are forgotten one by one when an input changes; beyond, all that was computed is.</summary>
    private const int FewQuantities = 1000;

    private readonly Reach[] _reaches;
    private readonly VariantSubject?[] _subjects;

    /// <summary>Makes a variant that as yet differs in nothing.</summary>
    /// <param name="map">The map of the design.</param>
    /// <param name="inputs">The inputs that will be changed.</param>
    public Variant(DependencyMap map, params IReadOnlyList<SubjectInput> inputs)
    {
        _reaches = [.. inputs.Select(map.ReachOf)];
        _subjects = new VariantSubject?[map.Design.Subjects.Count];
        Inputs = inputs;
    }

    /// <summary>The inputs that may be changed, by number.</summary>
    public IReadOnlyList<SubjectInput> Inputs { get; }

    /// <summary>What was computed in an earlier generation no longer holds.</summary>
    internal int Generation { get; private set; } = 1;

    /// <summary>Changes an input.</summary>
    /// <param name="input">Its number.</param>
    /// <param name="value">The value to take; missing for an input that is not given.</param>
    public void Set(int input, in Value value)
    {
        Forget(_reaches[input]);
        foreach (var each in _reaches[input].Inputs)
        {
            // What comes after the input itself are its groups.
            At(each.Subject).Override(each.Slot.Index, each == Inputs[input] ? value : Value.Of(!value.IsMissing));
        }
    }

    /// <summary>Takes an input as the design states it again.</summary>
    public void Reset(int input)
    {
        Forget(_reaches[input]);
        foreach (var each in _reaches[input].Inputs)
        {
            At(each.Subject).Restore(each.Slot.Index);
        }
    }

    /// <summary>Judges a rule.</summary>
    public Judgement Judge(RuleAt at) => Evaluation.Judge.Decide(at.Rule, At(at.Subject).Scope);

    /// <summary>A subject as it is with the changes.</summary>
    public ISubject Of(DesignSubject subject) => At(subject);

    internal VariantSubject At(DesignSubject subject) =>
        _subjects[subject.Index] ??= new VariantSubject(subject, this, ReachedOf(subject));

    private void Forget(Reach reach)
    {
        if (reach.Size > FewQuantities)
        {
            Generation++;
            return;
        }

        foreach (var (subject, quantities) in reach.Quantities)
        {
            _subjects[subject]?.Forget(quantities);
        }
    }

    private ulong[]? ReachedOf(DesignSubject subject)
    {
        ulong[]? all = null;
        foreach (var reach in _reaches)
        {
            if (reach.QuantitiesOf(subject) is { } words)
            {
                all = all is null ? words : [.. all.Zip(words, (a, b) => a | b)];
            }
        }

        return all;
    }
}
