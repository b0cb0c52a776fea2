using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Installation;
using Auditor.Formulas;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Evidence;

/// <summary>
/// Finds the assumed inputs and the figures from memory that findings rest on. Each quantity is looked into once, whoever asks, and the
/// same things under many quantities are held once.
/// </summary>
public sealed class Foundations
{
    private readonly AuditResult _result;
    private readonly Func<DesignSubject, QuantitySlot, FoundationSet> _ofQuantity;
    private readonly FoundationSets _sets = new();
    private readonly Dictionary<DesignSubject, FoundationSet?[]> _known = [];

    /// <summary>Begins with nothing known.</summary>
    /// <param name="result">The audit.</param>
    public Foundations(AuditResult result)
    {
        _result = result;
        _ofQuantity = OfQuantity;
    }

    /// <summary>What a finding rests on, in the order of kind and name.</summary>
    public IReadOnlyList<Foundation> Of(Finding finding)
    {
        var found = FoundationSet.None;
        if (finding.Verdict == Verdict.Unproven)
        {
            found = OfUncertainties(finding.WorstCase!);
        }
        else if (finding.Judgement.Marks == Marks.None)
        {
            return [];
        }

        var check = finding.Rule.Check;
        found = Add(found, check.Value, finding.Subject);
        foreach (var limit in check.Limits)
        {
            found = Add(found, limit, finding.Subject);
        }

        return (finding.Rule.When is { } when ? Add(found, when, finding.Subject) : found).Items;
    }

    /// <summary>What is not proven for the uncertainty of an instrument rests on what that uncertainty rests on.</summary>
    private FoundationSet OfUncertainties(WorstCase worst)
    {
        var found = FoundationSet.None;
        foreach (var (subject, slot) in worst.Corner.Where(value => value.Input.Kind == ToleranceKind.Instrument).Select(value => value.Input.Input))
        {
            found = _sets.Union(found, OfQuantity(subject, _result.Rules.UncertaintyOf(subject.Shape, slot)!.Slot));
        }

        return found;
    }

    private FoundationSet Add(FoundationSet before, Formula formula, DesignSubject subject)
    {
        var trace = new FoundationTrace(_result.Rules, _sets, _ofQuantity);
        formula.Evaluate(new Scope(subject, null, trace));
        return _sets.Union(before, trace.Found);
    }

    private FoundationSet OfQuantity(DesignSubject subject, QuantitySlot slot)
    {
        if (!_known.TryGetValue(subject, out var known))
        {
            _known.Add(subject, known = new FoundationSet?[subject.Shape.Quantities.Count]);
        }

        if (known[slot.Index] is not { } found)
        {
            // Until it is known, nothing stands for it: a quantity that needs itself adds nothing to what it rests on.
            known[slot.Index] = FoundationSet.None;
            known[slot.Index] = found = Add(FoundationSet.None, _result.Rules.Quantity(subject.Shape, slot.Index).Formula, subject);
        }

        return found;
    }
}
