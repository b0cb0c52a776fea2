namespace Auditor.Engine.Findings;

/// <summary>What a rule says of a subject.</summary>
public enum Verdict
{
    /// <summary>The requirement or recommendation is kept.</summary>
    Conforms,

    /// <summary>It is not kept.</summary>
    Nonconforming,

    /// <summary>It is kept as stated, but not wherever within the tolerances the true inputs may lie; only guarded acceptance says so.</summary>
    Unproven,

    /// <summary>It is not kept, and a departure in force accepts that.</summary>
    Departed,

    /// <summary>Something needed to tell is missing; never counted as kept.</summary>
    Undetermined,
}
