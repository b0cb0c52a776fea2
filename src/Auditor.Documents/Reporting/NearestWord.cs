namespace Auditor.Documents;

/// <summary>Finds the word that someone probably meant, by the fewest single-letter slips.</summary>
public static class NearestWord
{
    private const int LongestWord = 64;

    /// <summary>
    /// Returns the allowed word nearest to a wrong one, or null when none is near enough: at most one slip for every three
    /// letters. Letter case counts for nothing; of words equally near, the first is taken.
    /// </summary>
    /// <param name="word">The word as written.</param>
    /// <param name="allowed">The words that would have been right.</param>
    public static string? Find(string word, IEnumerable<string> allowed)
    {
        if (word.Length > LongestWord)
        {
            return null;
        }

        string? nearest = null;
        var fewest = (word.Length / 3) + 1;
        foreach (var candidate in allowed.Where(candidate => candidate.Length <= LongestWord))
        {
            var slips = Slips(word.ToLowerInvariant(), candidate.ToLowerInvariant());
            if (slips < fewest)
            {
                (nearest, fewest) = (candidate, slips);
            }
        }

        return nearest;
    }

    /// <summary>Counts letters added, left out, changed, or swapped with their neighbour.</summary>
    private static int Slips(string from, string to)
    {
        var beforeLast = new int[to.Length + 1];
        var last = Enumerable.Range(0, to.Length + 1).ToArray();
        var row = new int[to.Length + 1];
        for (var i = 1; i <= from.Length; i++)
        {
            row[0] = i;
            for (var j = 1; j <= to.Length; j++)
            {
                var changed = last[j - 1] + (from[i - 1] == to[j - 1] ? 0 : 1);
                row[j] = Math.Min(changed, Math.Min(last[j], row[j - 1]) + 1);
                if (i > 1 && j > 1 && from[i - 1] == to[j - 2] && from[i - 2] == to[j - 1])
                {
                    row[j] = Math.Min(row[j], beforeLast[j - 2] + 1);
                }
            }

            (beforeLast, last, row) = (last, row, beforeLast);
        }

        return last[to.Length];
    }
}
