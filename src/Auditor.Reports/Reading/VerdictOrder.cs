using Auditor.Engine.Findings;

namespace Auditor.Reports.Reading;

/// <summary>The order in which reports speak of verdicts.</summary>
internal static class VerdictOrder
{
    /// <summary>All verdicts, the gravest first.</summary>
    public static IReadOnlyList<Verdict> GravestFirst { get; } = [Verdict.Nonconforming, Verdict.Unproven, Verdict.Undetermined, Verdict.Departed, Verdict.Conforms];
}
