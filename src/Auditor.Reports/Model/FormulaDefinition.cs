namespace Auditor.Reports.Model;

/// <summary>A formula without numbers.</summary>
/// <param name="Role">What it gives: the value, the limit, or whether the statement holds.</param>
/// <param name="Text">Symbol and formula, joined by "=".</param>
public sealed record FormulaDefinition(string Role, string Text);
