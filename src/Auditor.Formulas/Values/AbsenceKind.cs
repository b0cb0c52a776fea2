namespace Auditor.Formulas.Values;

/// <summary>Why something is missing.</summary>
public enum AbsenceKind
{
    /// <summary>The design file does not give an input.</summary>
    Input,

    /// <summary>A table has no such row, or leaves the cell empty.</summary>
    Table,

    /// <summary>No curve is held for the device, or the curve does not reach that far.</summary>
    Curve,

    /// <summary>There is no such subject, such as the board fed by a circuit that feeds none.</summary>
    Subject,

    /// <summary>The calculation has no finite result.</summary>
    NotFinite,
}
