namespace Auditor.Reports.Model;

/// <summary>One rule and everything that it found.</summary>
/// <param name="Id">Id of the rule.</param>
/// <param name="Title">What is right when it conforms.</param>
/// <param name="IsRequirement">Whether it is a requirement ("shall"); otherwise it is a recommendation ("should").</param>
/// <param name="ClauseType">Type of the clause.</param>
/// <param name="References">Clauses of the standards.</param>
/// <param name="ClauseNote">What more there is to say of the clause; empty for nothing.</param>
/// <param name="Why">Why it matters.</param>
/// <param name="PutRightBy">Inputs that can put a nonconformity right, as the design file names them.</param>
/// <param name="Verdict">The gravest verdict among its findings, in one word.</param>
/// <param name="Margin">The least relative margin among them, with sign; empty where nothing was measured.</param>
/// <param name="Formulas">The formulas of value and limit, without numbers.</param>
/// <param name="Counts">How many findings have each verdict, the gravest first; verdicts without findings are left out.</param>
/// <param name="Findings">Its findings, the gravest and then the tightest first.</param>
public sealed record RuleFindings(
    string Id, string Title, bool IsRequirement, string ClauseType, IReadOnlyList<string> References, string ClauseNote, string Why,
    IReadOnlyList<string> PutRightBy, string Verdict, string Margin, IReadOnlyList<FormulaDefinition> Formulas, IReadOnlyList<RuleCount> Counts,
    IReadOnlyList<ReportFinding> Findings);
