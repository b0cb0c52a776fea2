using Auditor.Engine.Findings;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Guarded;

/// <summary>What becomes of a finding when every tolerance that it depends on is used up against it.</summary>
/// <param name="Judgement">The judgement there.</param>
/// <param name="Corner">Where the inputs lie then; those that make no difference are left out.</param>
/// <param name="WasSearched">
/// Whether the sign of each input's effect did not settle the corner, so that it had to be searched for: the margin is not monotone over a
/// tolerance, or what one input does depends on another.
/// </param>
/// <param name="Effects">What each input can do by itself, the greatest effect first.</param>
public sealed record WorstCase(Judgement Judgement, IReadOnlyList<CornerValue> Corner, bool WasSearched, IReadOnlyList<InputEffect> Effects)
{
    /// <summary>The margin there; null where it cannot be computed or nothing is measured.</summary>
    public Margin? Margin => Judgement.Margin;

    /// <summary>Whether the rule is kept there, or does not apply.</summary>
    public bool IsKept => Judgement.Verdict is null or Verdict.Conforms;

    /// <summary>What the tolerances rest on.</summary>
    public Marks Marks => Corner.Aggregate(Marks.None, (marks, value) => marks | value.Input.Marks);
}
