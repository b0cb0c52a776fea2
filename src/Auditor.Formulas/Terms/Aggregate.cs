namespace Auditor.Formulas.Terms;

/// <summary>The ways to gather a collection into one value.</summary>
internal enum Aggregate
{
    Sum,
    Min,
    Max,
    Count,
    All,
    Any,
}
