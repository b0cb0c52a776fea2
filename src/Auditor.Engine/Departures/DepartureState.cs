namespace Auditor.Engine.Departures;

/// <summary>What became of a recorded departure.</summary>
public enum DepartureState
{
    /// <summary>It covers a nonconformity.</summary>
    InForce,

    /// <summary>Its subject conforms, or cannot be judged.</summary>
    NotNeeded,

    /// <summary>Its last day is past.</summary>
    Expired,

    /// <summary>The rule allows no departure.</summary>
    Refused,

    /// <summary>There is no such rule, or it does not apply to such a subject.</summary>
    Unmatched,
}
