using Auditor.Engine.RuleSets;

namespace Auditor.Reports.Reading;

/// <summary>The words for provisions in files and reports.</summary>
internal static class ProvisionWords
{
    /// <summary>The word for a provision.</summary>
    public static string Word(this Provision provision) => provision == Provision.Requirement ? "requirement" : "recommendation";
}
