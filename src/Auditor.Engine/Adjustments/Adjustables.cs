using Auditor.Engine.Installation;

namespace Auditor.Engine.Adjustments;

/// <summary>Finds where the adjustments of a rule set can be made in a design.</summary>
public static class Adjustables
{
    /// <summary>Every place, in the order of subjects and then of adjustments by name. What the design leaves out cannot be changed, readings apart.</summary>
    public static IReadOnlyList<Adjustable> Of(Design design)
    {
        var byShape = design.Evaluator.Rules.Adjustments.ToLookup(adjustment => adjustment.Shape);
        return [.. design.Subjects
            .SelectMany(subject => byShape[subject.Shape].SelectMany(adjustment => At(adjustment, subject)))
            .Where(place => place.Steps() is not { Count: 0 })];
    }

    private static IEnumerable<Adjustable> At(Adjustment adjustment, DesignSubject subject)
    {
        var circuit = adjustment.Path == adjustment.Slot.Path ? null : subject.Parent;
        if (circuit is null)
        {
            return IsThere(adjustment, subject) ? [new Adjustable(adjustment, subject, [subject])] : [];
        }

        if (circuit.Legs.Count == 1)
        {
            return IsThere(adjustment, subject) ? [new Adjustable(adjustment, circuit, [subject])] : [];
        }

        if (adjustment.AllLegs && AreAlike(adjustment, circuit))
        {
            return subject == circuit.Legs[0] ? [new Adjustable(adjustment, circuit, circuit.Legs)] : [];
        }

        return IsThere(adjustment, subject) ? [new Adjustable(adjustment, subject, [subject])] : [];
    }

    private static bool IsThere(Adjustment adjustment, DesignSubject subject) =>
        adjustment.IsReading || !subject.Input(adjustment.Slot.Index).IsMissing;

    private static bool AreAlike(Adjustment adjustment, DesignSubject circuit)
    {
        var first = circuit.Legs[0].Input(adjustment.Slot.Index);
        return circuit.Legs.All(leg => Adjustable.Same(leg.Input(adjustment.Slot.Index), first));
    }
}
