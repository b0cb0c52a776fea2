namespace Auditor.Engine.Departures;

/// <summary>What became of a recorded departure.</summary>
public enum DepartureState
{
    /// <summary>It covers a nonconformity.</summary>
    InForce,

    /// <summary>Every finding that it speaks of conforms, or cannot be judged.</summary>
    NotNeeded,

    /// <summary>Its last day is past.</summary>
    Expired,

    /// <summary>The rule allows no departure.</summary>
    Forbidden,

    /// <summary>There is no such rule, or it applies to no such subject.</summary>
    Unmatched,
}
