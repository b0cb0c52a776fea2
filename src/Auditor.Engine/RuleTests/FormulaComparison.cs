namespace Auditor.Engine.RuleTests;

/// <summary>A comparison in the text of a formula.</summary>
/// <param name="Operator">The operator: <c>==</c>, <c>!=</c>, <c>&lt;</c>, <c>&lt;=</c>, <c>&gt;</c> or <c>&gt;=</c>.</param>
/// <param name="Right">What stands to its right.</param>
public sealed record FormulaComparison(FormulaPart Operator, FormulaPart Right)
{
    /// <summary>Whether it asks for more or less, not for sameness.</summary>
    public bool IsOrdered => Operator.Text is not ("==" or "!=");
}
