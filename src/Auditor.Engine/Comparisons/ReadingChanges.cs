using Auditor.Engine.Evidence;
using Auditor.Engine.Installation;

namespace Auditor.Engine.Comparisons;

/// <summary>Finds the changes that one thing read by a formula stands for, quantities apart.</summary>
internal sealed class ReadingChanges(ChangeIndex changes)
{
    /// <summary>The subject and the name that a reading read; null for rule data.</summary>
    public static (DesignSubject Subject, string Name)? NameOf(Tracer.Reading reading) =>
        reading.Subject is DesignSubject subject ? (subject, reading.Input?.Path ?? reading.Quantity!.Symbol) : null;

    /// <summary>Changes of the parameter, table or curve that was read.</summary>
    public ChangeBits OfRuleData(Tracer.Reading reading, RevisionSide side, IReadOnlyList<Tracer.Reading> others)
    {
        if (reading.Parameter is { } parameter)
        {
            return changes.OfRules(RuleItem.Parameter, side.Rules.Parameters[parameter.Index].Id);
        }

        if (reading.Curve is { } curve)
        {
            return others.Any(other => other.Curve?.Source.Id == curve.Source.Id && other.CurveReading == reading.CurveReading && CauseFinder.IsSame(other.Value, reading.Value))
                ? ChangeBits.None
                : changes.OfRules(RuleItem.Curve, curve.Source.Id);
        }

        return reading.Lookup is { } lookup
            ? reading.Cells.Aggregate(changes.OfRules(RuleItem.Lookup, lookup.Name), (found, cell) => found.Or(changes.OfCell(cell)))
            : ChangeBits.None;
    }

    /// <summary>Changes of the input that was read, at a subject that both revisions have.</summary>
    public ChangeBits OfInput(Tracer.Reading reading, DesignSubject subject, DesignSubject partner, RevisionSide side) => reading.Input?.Path switch
    {
        null => ChangeBits.None,
        Shapes.FeedsBoard => changes.OfInput(subject.Key, side.IsLater, "feeds"),
        Shapes.IsRoot => changes.OfMove(side.Of(subject)),
        Shapes.Key or "id" or "to" => subject.Key == partner.Key ? ChangeBits.None : OfWhole(subject, side),
        var path => changes.OfInput(subject.Key, side.IsLater, path),
    };

    /// <summary>The change of a subject as such, or of the nearest one that it belongs to.</summary>
    public ChangeBits OfWhole(DesignSubject subject, RevisionSide side)
    {
        var found = ChangeBits.None;
        for (var at = subject; at is not null && ReferenceEquals(found, ChangeBits.None); at = at.Parent)
        {
            found = changes.OfSubject(side.Of(at));
        }

        return found;
    }

    /// <summary>The moves of all subjects on the way from a reader to what it reads.</summary>
    public ChangeBits OfWay(DesignSubject reader, DesignSubject read, RevisionSide side)
    {
        var up = Line(reader);
        var down = Line(read);
        return up.Except(down).Concat(down.Except(up)).Aggregate(ChangeBits.None, (found, subject) => found.Or(changes.OfMove(side.Of(subject))));
    }

    private static List<DesignSubject> Line(DesignSubject subject)
    {
        var line = new List<DesignSubject>();
        for (var at = subject; at is not null; at = at.Parent)
        {
            line.Add(at);
        }

        return line;
    }
}
