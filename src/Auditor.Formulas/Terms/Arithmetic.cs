namespace Auditor.Formulas.Terms;

/// <summary>The arithmetic operations.</summary>
internal enum Arithmetic
{
    Add,
    Subtract,
    Multiply,
    Divide,
    Power,
}
