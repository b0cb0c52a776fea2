namespace Auditor.Engine.Evidence;

/// <summary>What a formula took something from.</summary>
public enum EvidenceKind
{
    /// <summary>An input of the design file.</summary>
    Input,

    /// <summary>Another quantity.</summary>
    Quantity,

    /// <summary>A parameter of the rule set.</summary>
    Parameter,

    /// <summary>A cell of a table.</summary>
    Cell,

    /// <summary>A reading of a time-current curve.</summary>
    Curve,

    /// <summary>Something that is missing.</summary>
    Missing,
}
