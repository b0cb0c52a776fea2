namespace Auditor.Formulas.Terms;

/// <summary>The comparisons.</summary>
internal enum Relation
{
    Equal,
    NotEqual,
    Less,
    AtMost,
    Greater,
    AtLeast,
}
