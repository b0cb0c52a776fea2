namespace Auditor.Formulas.Tables;

/// <summary>What a lookup gives between two tabulated values of a key.</summary>
public enum Between
{
    /// <summary>Nothing: the key must be tabulated.</summary>
    None,

    /// <summary>A straight line.</summary>
    Linear,

    /// <summary>A straight line on logarithmic axes.</summary>
    LogLog,

    /// <summary>The next tabulated key upward; below the first the first holds, above the last nothing does.</summary>
    NextRow,
}
