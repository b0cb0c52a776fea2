namespace Auditor.Reports.Model;

/// <summary>The caution that every report and every summary carries.</summary>
public static class Caution
{
    /// <summary>The caution, as one paragraph.</summary>
    public const string Text =
        "Electricity kills. These findings compare what the input files state with what the rule set holds, and are only as good as both. "
        + "Local codes and the licensed or otherwise competent person who answers for the work decide what may be built and put into service. "
        + "No finding replaces inspection and testing.";
}
