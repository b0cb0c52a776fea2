namespace Auditor.Engine.Findings;

/// <summary>The words for verdicts in files and reports.</summary>
public static class VerdictWords
{
    /// <summary>The word for a verdict.</summary>
    public static string Word(this Verdict verdict) => verdict switch
    {
        Verdict.Conforms => "conforms",
        Verdict.Nonconforming => "nonconforming",
        Verdict.Unproven => "unproven",
        Verdict.Departed => "departed",
        _ => "undetermined",
    };

    /// <summary>The verdict of a word; null for any other word.</summary>
    public static Verdict? Find(string word)
    {
        foreach (var verdict in Enum.GetValues<Verdict>())
        {
            if (verdict.Word() == word)
            {
                return verdict;
            }
        }

        return null;
    }
}
