namespace Auditor.Engine.Findings;

/// <summary>The words for verdicts in files and reports.</summary>
public static class VerdictWords
{
    /// <summary>The word for a verdict.</summary>
    public static string Word(this Verdict verdict) => verdict switch
    {
        Verdict.Conforms => "conforms",
        Verdict.Nonconforming => "nonconforming",
        Verdict.Departed => "departed",
        _ => "undetermined",
    };
}
