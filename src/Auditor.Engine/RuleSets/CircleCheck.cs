using System.Runtime.InteropServices;
using Auditor.Documents;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.RuleSets;

/// <summary>
/// Finds quantities that need one another. A chain that only ever looks up, or only ever looks down, ends at the origin or at the loads;
/// one that stays at a subject, or that looks up and down, can come back to where it began and is refused.
/// </summary>
internal sealed class CircleCheck
{
    private readonly QuantityDefinition[] _quantities;
    private readonly Need[] _needs;
    private readonly Problems _problems;

    /// <summary>Makes the check.</summary>
    /// <param name="quantities">Quantities by kind of subject and slot; null where the formula has a problem of its own.</param>
    /// <param name="problems">Receives the circles.</param>
    public CircleCheck(QuantityDefinition?[][] quantities, Problems problems)
    {
        _quantities = [.. quantities.SelectMany(list => list).OfType<QuantityDefinition>()];
        _problems = problems;
        var numbers = _quantities.Index().ToDictionary(entry => (entry.Item.Shape, entry.Item.Slot), entry => entry.Index);
        _needs = [.. _quantities.SelectMany((quantity, from) => quantity.Formula.References
            .Where(reference => reference.Quantity is not null && numbers.ContainsKey((reference.Shape, reference.Quantity)))
            .Select(reference => new Need(from, numbers[(reference.Shape, reference.Quantity!)], reference.Direction)).Distinct())];
    }

    /// <summary>Tells of each set of quantities that need one another by one of its circles.</summary>
    public void Run()
    {
        foreach (var part in Parts([.. _needs.Where(need => need.Direction == Direction.Same)]))
        {
            Tell(part, part[0], part[0]);
        }

        foreach (var part in Parts(_needs))
        {
            var up = part.FindIndex(need => need.Direction.HasFlag(Direction.Up));
            var down = part.FindIndex(need => need.Direction.HasFlag(Direction.Down));
            if (up >= 0 && down >= 0)
            {
                Tell(part, part[up], part[down]);
            }
        }
    }

    /// <summary>The needs that lie on circles, in parts within which every quantity needs every other.</summary>
    private IEnumerable<List<Need>> Parts(IReadOnlyList<Need> needs)
    {
        var next = _quantities.Select(_ => new List<int>()).ToArray();
        foreach (var need in needs)
        {
            next[need.From].Add(need.To);
        }

        var part = StrongComponents.Of(next);
        return needs.Where(need => part[need.From] == part[need.To]).GroupBy(need => part[need.From]).Select(group => group.ToList());
    }

    /// <summary>Tells the circle that runs through two needs of a part, or through one where they are the same.</summary>
    private void Tell(List<Need> part, Need first, Need second)
    {
        List<Need> circle = first == second
            ? [first, .. Way(part, first.To, first.From)]
            : [first, .. Way(part, first.To, second.From), second, .. Way(part, second.To, first.From)];
        var names = circle.Select(need => need.To).Prepend(first.From).Select(number => $"{_quantities[number].Shape.Name} {_quantities[number].Slot.Symbol}");
        _problems.Add(RuleMessages.Circle(_quantities[first.From].Formula.Source.Span, string.Join(" → ", names)));
    }

    /// <summary>The shortest way from one quantity to another within a part.</summary>
    private static List<Need> Way(List<Need> part, int from, int to)
    {
        var reachedBy = new Dictionary<int, Need>();
        var next = part.ToLookup(need => need.From);
        var open = new Queue<int>([from]);
        while (from != to && !reachedBy.ContainsKey(to))
        {
            foreach (var need in next[open.Dequeue()].Where(need => reachedBy.TryAdd(need.To, need)))
            {
                open.Enqueue(need.To);
            }
        }

        var way = new List<Need>();
        for (var at = to; at != from; at = way[0].From)
        {
            way.Insert(0, reachedBy[at]);
        }

        return way;
    }

    /// <summary>That a quantity needs another, and which way it looks for it.</summary>
    [StructLayout(LayoutKind.Auto)]
    private readonly record struct Need(int From, int To, Direction Direction);
}
