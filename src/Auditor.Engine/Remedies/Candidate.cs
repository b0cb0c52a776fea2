using Auditor.Engine.Adjustments;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Remedies;

/// <summary>An adjustment that may put a finding right, with the values to try.</summary>
internal sealed class Candidate
{
    /// <summary>A tenth of the stated value counts as one step of a range.</summary>
    private const double StepOfRange = 0.1;

    public Candidate(DependencyMap map, Adjustable place, bool isNamed)
    {
        Place = place;
        IsNamed = isNamed;
        Terms = place.Adjustment.Remedy!;
        Steps = place.Adjustment.Ladder is RangeLadder ? [] : [.. StepsOf(new AdjustedDesign(map, place).Steps()!)];
        Ends = place.Adjustment.Ladder is RangeLadder range ? [.. EndsOf(range)] : [];
    }

    public Adjustable Place { get; }

    /// <summary>Whether the rule of the finding names it.</summary>
    public bool IsNamed { get; }

    public RemedyTerms Terms { get; }

    /// <summary>The values to try, the least change first; empty for a range.</summary>
    public IReadOnlyList<Change> Steps { get; }

    /// <summary>For a range: how far it may go, each way.</summary>
    public IReadOnlyList<double> Ends { get; }

    /// <summary>A value of a range, rounded towards its end; null where rounding leads beyond it.</summary>
    public Change? Rounded(double number, double end)
    {
        var stated = Place.Stated.Number;
        if (Terms.Round > 0)
        {
            var steps = number / Terms.Round;
            number = Terms.Round * (end < stated ? Math.Floor(steps) : Math.Ceiling(steps));
        }

        return (end < stated ? number < end : number > end) ? null : Moved(number);
    }

    /// <summary>A value of a range, part of the way to its end, rounded; null where rounding leads beyond it.</summary>
    public Change? At(double end, double share) => Rounded(Place.Stated.Number + ((end - Place.Stated.Number) * share), end);

    /// <summary>Whether it changes the same input as another.</summary>
    public bool IsSameInput(Candidate other) =>
        Place.Adjustment.Slot == other.Place.Adjustment.Slot && Place.Holders.Intersect(other.Place.Holders).Any();

    private Change Moved(double number)
    {
        var stated = Place.Stated.Number;
        var steps = stated == 0 ? 1 : (int)Math.Ceiling((Math.Abs(number - stated) / Math.Abs(stated) / StepOfRange) - 1e-9);
        return new Change(Place, Value.Of(number), Terms.Effort + Math.Max(0, steps - 1));
    }

    private IEnumerable<Change> StepsOf(IReadOnlyList<Value> steps)
    {
        var stated = Terms.Adds ? -1 : steps.ToList().FindIndex(step => Adjustable.Same(step, Place.Stated));
        if (stated < 0 && !Terms.Adds)
        {
            return [];
        }

        return steps.Select((value, place) => (Value: value, Way: place - stated))
            .Where(step => step.Way != 0 && Math.Abs(step.Way) <= Terms.Most && IsAllowed(step.Way))
            .OrderBy(step => Math.Abs(step.Way)).ThenBy(step => step.Way)
            .Select(step => new Change(Place, step.Value, Terms.Effort + Math.Abs(step.Way) - 1));
    }

    private IEnumerable<double> EndsOf(RangeLadder range)
    {
        var stated = Place.Stated.Number;
        if (IsAllowed(-1) && Math.Max(range.From, stated - (Math.Abs(stated) * Terms.Share)) is var least && least < stated)
        {
            yield return least;
        }

        if (IsAllowed(1) && Math.Min(range.To, stated + (Math.Abs(stated) * Terms.Share)) is var most && most > stated)
        {
            yield return most;
        }
    }

    private bool IsAllowed(int way) => Terms.Way == RemedyWay.Either || (Terms.Way == RemedyWay.Up) == (way > 0);
}
