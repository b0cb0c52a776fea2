namespace Auditor.Formulas.Types;

/// <summary>What a formula gives.</summary>
public enum FormulaKind
{
    /// <summary>A number with a dimension; a pure number has the dimension 1.</summary>
    Quantity,

    /// <summary>A word or free text.</summary>
    Text,

    /// <summary>True or false.</summary>
    Flag,

    /// <summary>A list of words.</summary>
    Words,

    /// <summary>A group of inputs (a mapping of the design file); only its presence can be asked for.</summary>
    Group,
}
