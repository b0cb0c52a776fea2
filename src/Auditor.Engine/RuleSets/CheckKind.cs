namespace Auditor.Engine.RuleSets;

/// <summary>The comparisons a rule may make.</summary>
public enum CheckKind
{
    /// <summary>The value is at most the limit.</summary>
    AtMost,

    /// <summary>The value is at least the limit.</summary>
    AtLeast,

    /// <summary>The value lies between two limits, both allowed.</summary>
    Within,

    /// <summary>The value is the limit.</summary>
    Equal,

    /// <summary>The value is one of several.</summary>
    OneOf,

    /// <summary>The flag is true.</summary>
    Require,
}
