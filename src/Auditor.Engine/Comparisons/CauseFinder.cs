using Auditor.Engine.Evidence;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Comparisons;

/// <summary>
/// Finds which changes a finding rests on: evaluates its formulas once more in both revisions with somebody listening, and follows what
/// they read for as long as its value differs between the revisions. What has the same value in both can have moved nothing.
/// Each quantity is looked into once, whoever asks.
/// </summary>
/// <param name="before">The earlier revision.</param>
/// <param name="after">The later revision.</param>
/// <param name="changes">What differs between them.</param>
internal sealed class CauseFinder(RevisionSide before, RevisionSide after, ChangeIndex changes)
{
    private readonly Dictionary<(DesignSubject Before, string Symbol), ChangeBits> _known = [];
    private readonly ReadingChanges _readings = new(changes);

    /// <summary>The changes that what a rule says of a subject rests on.</summary>
    /// <param name="ruleBefore">The rule in the earlier rule set; null where it has none.</param>
    /// <param name="subjectBefore">The subject in the earlier revision.</param>
    /// <param name="ruleAfter">The rule in the later rule set; null where it has none.</param>
    /// <param name="subjectAfter">The same subject in the later revision.</param>
    public ChangeBits Of(Rule? ruleBefore, DesignSubject subjectBefore, Rule? ruleAfter, DesignSubject subjectAfter)
    {
        var own = changes.OfRules(RuleItem.Rule, (ruleAfter ?? ruleBefore)!.Id);
        if (ruleBefore is null || ruleAfter is null)
        {
            return own;
        }

        var found = ruleBefore.Provision != ruleAfter.Provision || ruleBefore.Check.How != ruleAfter.Check.How ? own : ChangeBits.None;
        foreach (var (one, other) in Pairs(ruleBefore, ruleAfter))
        {
            var isSame = one is not null && other is not null && IsSame(one.Evaluate(subjectBefore.Scope), other.Evaluate(subjectAfter.Scope));
            found = isSame ? found : found.Or(OfFormulas(one, subjectBefore, other, subjectAfter, own));
        }

        return found;
    }

    private static IEnumerable<(Formula? One, Formula? Other)> Pairs(Rule before, Rule after)
    {
        if (before.When is not null || after.When is not null)
        {
            yield return (before.When, after.When);
        }

        yield return (before.Check.Value, after.Check.Value);
        for (var i = 0; i < Math.Max(before.Check.Limits.Count, after.Check.Limits.Count); i++)
        {
            yield return (before.Check.Limits.ElementAtOrDefault(i), after.Check.Limits.ElementAtOrDefault(i));
        }
    }

    private ChangeBits OfFormulas(Formula? one, DesignSubject subjectBefore, Formula? other, DesignSubject subjectAfter, ChangeBits own)
    {
        var isSameText = one is not null && other is not null && NumbersPutIn.OneLine(one.Text) == NumbersPutIn.OneLine(other.Text);
        var earlier = RevisionSide.Readings(one, subjectBefore);
        var later = RevisionSide.Readings(other, subjectAfter);
        return (isSameText ? ChangeBits.None : own)
            .Or(OfReadings(earlier, subjectBefore, before, later))
            .Or(OfReadings(later, subjectAfter, after, earlier));
    }

    private ChangeBits OfReadings(
        IReadOnlyList<Tracer.Reading> readings, DesignSubject reader, RevisionSide side, IReadOnlyList<Tracer.Reading> others)
    {
        var found = ChangeBits.None;
        var namesakes = new Lazy<HashSet<(DesignSubject, string)>>(() => [.. others.Select(ReadingChanges.NameOf).OfType<(DesignSubject, string)>()]);
        foreach (var reading in readings)
        {
            found = found.Or(_readings.OfRuleData(reading, side, others));
            if (reading.Subject is DesignSubject subject)
            {
                found = found.Or(side.PartnerOf(subject) is { } partner
                    ? _readings.OfInput(reading, subject, partner, side).Or(OfQuantity(reading, subject, partner, side))
                    : _readings.OfWhole(subject, side));
                var isReadByBoth = side.PartnerOf(subject) is { } twin && namesakes.Value.Contains((twin, ReadingChanges.NameOf(reading)!.Value.Name));
                found = isReadByBoth ? found : found.Or(_readings.OfWay(reader, subject, side));
            }
        }

        return found;
    }

    private ChangeBits OfQuantity(Tracer.Reading reading, DesignSubject subject, DesignSubject partner, RevisionSide side)
    {
        if (reading.Quantity is not { } quantity)
        {
            return ChangeBits.None;
        }

        var (earlier, later) = side.IsLater ? (partner, subject) : (subject, partner);
        if (!_known.TryGetValue((earlier, quantity.Symbol), out var found))
        {
            _known.Add((earlier, quantity.Symbol), ChangeBits.None);
            found = OfQuantity(earlier, later, quantity.Symbol);
            _known[(earlier, quantity.Symbol)] = found;
        }

        return found;
    }

    private ChangeBits OfQuantity(DesignSubject earlier, DesignSubject later, string symbol)
    {
        var one = before.Definition(earlier, symbol);
        var other = after.Definition(later, symbol);
        return one is not null && other is not null && IsSame(earlier.Quantity(one.Slot.Index), later.Quantity(other.Slot.Index))
            ? ChangeBits.None
            : OfFormulas(one?.Formula, earlier, other?.Formula, later, changes.OfRules(RuleItem.Quantity, RuleSetComparer.NameOf((other ?? one)!)));
    }

    /// <summary>Whether two values are the same in every respect that a finding could show.</summary>
    internal static bool IsSame(in Value one, in Value other)
    {
        if (one.Kind != other.Kind || one.Marks != other.Marks)
        {
            return false;
        }

        return one.Kind switch
        {
            ValueKind.Quantity => Comparison.Same(one.Number, other.Number),
            ValueKind.Missing => one.Absences.Items.SequenceEqual(other.Absences.Items),
            ValueKind.Flag => one.Flag == other.Flag,
            ValueKind.Words => one.Words.SequenceEqual(other.Words),
            _ => one.Text == other.Text,
        };
    }
}
