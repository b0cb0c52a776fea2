namespace Auditor.Formulas.Values;

/// <summary>What a <see cref="Value"/> holds.</summary>
public enum ValueKind : byte
{
    /// <summary>Nothing: an input, a table row or a way that it needs is not there.</summary>
    Missing,

    /// <summary>A number in coherent units.</summary>
    Quantity,

    /// <summary>A text.</summary>
    Text,

    /// <summary>True or false.</summary>
    Flag,

    /// <summary>A list of words.</summary>
    Words,
}
