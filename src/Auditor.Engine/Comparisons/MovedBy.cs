namespace Auditor.Engine.Comparisons;

/// <summary>What moved a finding.</summary>
[Flags]
public enum MovedBy
{
    /// <summary>Nothing that the evidence at hand tells.</summary>
    Untold = 0,

    /// <summary>The design.</summary>
    Design = 1,

    /// <summary>The rule set.</summary>
    RuleSet = 2,

    /// <summary>A departure that came, went or ran out.</summary>
    Departure = 4,
}
