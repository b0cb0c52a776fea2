using Auditor.Engine.Adjustments;
using Auditor.Engine.Findings;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Remedies;

/// <summary>One or two changes that put a finding right and make no other, as a new audit of all that they touch has shown.</summary>
public sealed record Remedy
{
    /// <summary>The changes.</summary>
    public required IReadOnlyList<Change> Changes { get; init; }

    /// <summary>Every input that differs then, those that follow from the changes among them.</summary>
    public required IReadOnlyList<ChangedInput> Inputs { get; init; }

    /// <summary>How great the changes are together, compared with other remedies.</summary>
    public required int Effort { get; init; }

    /// <summary>The verdict on the rule then; null where it no longer applies.</summary>
    public required Verdict? Verdict { get; init; }

    /// <summary>The margin of the finding before, by guarded acceptance in the worst case; null where nothing is measured.</summary>
    public required Margin? Before { get; init; }

    /// <summary>The same with the changes made.</summary>
    public required Margin? After { get; init; }

    /// <summary>Other rules that are kept with less margin than before, or broken by more; the greatest loss first.</summary>
    public required IReadOnlyList<MarginMove> Worsened { get; init; }

    /// <summary>Other nonconformities that are put right as well, in the order of findings.</summary>
    public required IReadOnlyList<RuleAt> AlsoRight { get; init; }

    /// <summary>Rules that come to apply and lack input, and recommendations that can no longer be judged; in the order of findings.</summary>
    public required IReadOnlyList<RuleAt> Open { get; init; }

    /// <summary>How many rules were judged again to prove it.</summary>
    public required int Rechecked { get; init; }
}
