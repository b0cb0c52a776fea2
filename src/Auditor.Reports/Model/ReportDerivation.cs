namespace Auditor.Reports.Model;

/// <summary>What a finding comes down to.</summary>
/// <param name="Condition">The formulas of the condition under which the rule applies, joined by "="; empty where it always does.</param>
/// <param name="Quantities">The quantities that condition, value and limit name, each with its working.</param>
/// <param name="Inputs">Lines of the design that value and limit rest on in the end.</param>
/// <param name="MoreInputs">How many more there are than are listed here; the workings name them all.</param>
/// <param name="Figures">Cells of tables, readings of curves and parameters that they rest on in the end.</param>
/// <param name="MoreFigures">How many more there are than are listed here.</param>
public sealed record ReportDerivation(
    string Condition, IReadOnlyList<ReportSource> Quantities, IReadOnlyList<ReportSource> Inputs, int MoreInputs, IReadOnlyList<ReportSource> Figures,
    int MoreFigures);
