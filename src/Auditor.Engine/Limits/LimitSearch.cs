using Auditor.Engine.Adjustments;
using Auditor.Engine.Installation;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Limits;

/// <summary>
/// Finds how far adjustable inputs may go before each rule bites. Values are tried over the whole range of an input; where a rule ceases
/// to be kept between two of them, the place is found and verified. Where the margin has a peak or a dip between tried values, it is followed
/// to its end; a jump that comes and goes within a few steps between them can be missed.
/// </summary>
public static class LimitSearch
{
    /// <summary>Runs the search.</summary>
    /// <param name="design">The design.</param>
    /// <param name="inputs">The inputs to look into.</param>
    public static LimitResult Run(Design design, IReadOnlyList<Adjustable> inputs)
    {
        var map = new DependencyMap(design);
        var found = new InputLimit[inputs.Count];
        long judged = 0;
        Parallel.For(0, inputs.Count, i =>
        {
            found[i] = Of(map, inputs[i], out var own);
            Interlocked.Add(ref judged, own);
        });
        return new LimitResult(design, found, judged);
    }

    private static InputLimit Of(DependencyMap map, Adjustable input, out long judged)
    {
        var trial = new Trial(map, input);
        var rules = RuleLimits.Of(trial);
        var required = AllowedRanges.Of(rules.Where(AllowedRanges.IsRequired));
        var guard = input.Adjustment.IsReading ? map.Design.Evaluator.Rules.UncertaintyOf(input.Adjustment.Shape, input.Adjustment.Slot) : null;
        judged = trial.Judged;
        AllowedRange? guarded = null;
        if (guard is not null)
        {
            var guardedTrial = new Trial(map, input, guard);
            guarded = AllowedRanges.Around(AllowedRanges.Of(RuleLimits.Of(guardedTrial).Where(AllowedRanges.IsRequired)), guardedTrial.Stated);
            judged += guardedTrial.Judged;
        }

        return new InputLimit
        {
            Input = input,
            Expected = trial.Expected ?? Value.Missing(NothingSaid(input)),
            Rules = rules,
            Required = required,
            Around = AllowedRanges.Around(required, trial.Stated),
            Advised = AllowedRanges.Around(AllowedRanges.Of(rules), trial.Stated),
            Guarded = guarded,
            IsGuarded = guard is not null,
        };
    }

    private static Absence NothingSaid(Adjustable input) =>
        new(AbsenceKind.Input, input.Subject.Key, input.Adjustment.Path, "nothing is said of what to expect", "");
}
