namespace Auditor.Engine.Limits;

/// <summary>How a rule bounds an adjustable input, over the values that the input may take.</summary>
public enum LimitKind
{
    /// <summary>It is kept over one stretch of values, and not beyond.</summary>
    Limit,

    /// <summary>It is kept whatever the value.</summary>
    NoLimit,

    /// <summary>It is kept at no value at which it can be judged.</summary>
    AlwaysFails,

    /// <summary>It is kept over several stretches, with values between them at which it is not.</summary>
    NotMonotone,

    /// <summary>It cannot be judged at any value.</summary>
    Undetermined,
}
