namespace Auditor.Reports.Model;

/// <summary>One formula of a finding, on one line.</summary>
/// <param name="Role">What it gives: the value, the limit, or whether the statement holds.</param>
/// <param name="Text">
/// Symbol, formula, the formula with numbers put in, and result, joined by "="; whatever would only repeat its neighbour is left out.
/// </param>
/// <param name="Definition">Symbol and formula, joined by "=": the same for every finding of a rule.</param>
/// <param name="Numbers">The formula with numbers put in; empty where that says no more than the definition or the result.</param>
public sealed record FormulaLine(string Role, string Text, string Definition, string Numbers);
