using Auditor.Formulas.Values;

namespace Auditor.Formulas.Tables;

/// <summary>The words for <see cref="Trust"/> in rule files and reports.</summary>
public static class TrustWords
{
    private static readonly Dictionary<string, Trust> ByWord = new()
    {
        ["two sources"] = Trust.TwoSources,
        ["one source"] = Trust.OneSource,
        ["derived"] = Trust.Derived,
        ["common practice"] = Trust.CommonPractice,
        ["memory cross-checked"] = Trust.MemoryCrossChecked,
        ["memory"] = Trust.Memory,
    };

    /// <summary>All words, from the best.</summary>
    public static IReadOnlyCollection<string> All => ByWord.Keys;

    /// <summary>The trust that a word means, or null.</summary>
    public static Trust? Find(string word) => ByWord.TryGetValue(word, out var trust) ? trust : null;

    /// <summary>The word for a trust.</summary>
    public static string Word(this Trust trust) => ByWord.First(pair => pair.Value == trust).Key;

    /// <summary>The mark that a figure of this trust leaves on every value that rests on it.</summary>
    public static Marks Mark(this Trust trust) => trust >= Trust.MemoryCrossChecked ? Marks.FromMemory : Marks.None;
}
