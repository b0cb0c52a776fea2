namespace Auditor.Reports.Model;

/// <summary>How the quantities behind the findings were computed.</summary>
/// <param name="Subjects">The subjects whose quantities are shown, in the order of the design.</param>
/// <param name="Definitions">The definitions of these quantities, by kind of subject and symbol.</param>
/// <param name="Unfolded">How many findings have a derivation.</param>
/// <param name="Short">How many have none, since the report would grow too large; their formulas are shown all the same.</param>
public sealed record ReportWorkings(IReadOnlyList<SubjectWorkings> Subjects, IReadOnlyList<ReportDefinition> Definitions, int Unfolded, int Short);
