using Auditor.Engine.Installation;

namespace Auditor.Engine.Adjustments;

/// <summary>Finds where the adjustments of a rule set can be made in a design.</summary>
public static class Adjustables
{
    /// <summary>
    /// Every place whose limits are worth telling, in the order of subjects and then of adjustments by name. What the design leaves out
    /// cannot be changed, readings apart.
    /// </summary>
    public static IReadOnlyList<Adjustable> WithLimits(Design design) => Of(design, design.Subjects, adjustment => adjustment.HasLimits);

    /// <summary>The places at some subjects where an adjustment may serve as a remedy, in the same order.</summary>
    public static IReadOnlyList<Adjustable> Remedies(Design design, IEnumerable<DesignSubject> subjects) =>
        Of(design, subjects, adjustment => adjustment.Remedy is not null);

    private static IReadOnlyList<Adjustable> Of(Design design, IEnumerable<DesignSubject> subjects, Func<Adjustment, bool> serves)
    {
        var byShape = design.Evaluator.Rules.Adjustments.Where(serves).ToLookup(adjustment => adjustment.Shape);
        return [.. subjects
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

    private static bool IsThere(Adjustment adjustment, DesignSubject subject)
    {
        var isGiven = !subject.Input(adjustment.Slot.Index).IsMissing;
        return adjustment.Remedy is { Adds: true } ? !isGiven && !HasGroup(adjustment, subject) : adjustment.IsReading || isGiven;
    }

    /// <summary>Whether the design gives anything of the group that the input lies in.</summary>
    private static bool HasGroup(Adjustment adjustment, DesignSubject subject)
    {
        var name = adjustment.Slot.Name;
        return name.LastIndexOf('.') is > 0 and var dot && subject.Shape.Input(name[..dot]) is { } group && subject.Input(group.Index).IsTrue;
    }

    private static bool AreAlike(Adjustment adjustment, DesignSubject circuit)
    {
        var first = circuit.Legs[0].Input(adjustment.Slot.Index);
        return circuit.Legs.All(leg => Adjustable.Same(leg.Input(adjustment.Slot.Index), first));
    }
}
