namespace Auditor.Engine.Adjustments;

/// <summary>Which way an adjustment goes when it serves as a remedy.</summary>
public enum RemedyWay
{
    /// <summary>Towards later steps of its ladder, or larger values.</summary>
    Up,

    /// <summary>Towards earlier steps of its ladder, or smaller values.</summary>
    Down,

    /// <summary>Either way.</summary>
    Either,
}
