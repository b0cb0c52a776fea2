namespace Auditor.Formulas.Values;

/// <summary>What a value rests on besides measured or designed inputs and read figures; spreads through every operation.</summary>
[Flags]
public enum Marks : byte
{
    /// <summary>Nothing of note.</summary>
    None = 0,

    /// <summary>At least one input is marked <c>assumed</c>.</summary>
    Assumed = 1,

    /// <summary>At least one table cell or curve was entered from memory.</summary>
    FromMemory = 2,
}
