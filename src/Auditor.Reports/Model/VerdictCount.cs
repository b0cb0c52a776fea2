namespace Auditor.Reports.Model;

/// <summary>How many findings have a verdict.</summary>
/// <param name="Verdict">The verdict, in words.</param>
/// <param name="Requirements">Findings of requirements ("shall").</param>
/// <param name="Recommendations">Findings of recommendations ("should").</param>
/// <param name="Total">Both together.</param>
/// <param name="OnAssumption">How many of them hang on an assumed input.</param>
public sealed record VerdictCount(string Verdict, int Requirements, int Recommendations, int Total, int OnAssumption);
