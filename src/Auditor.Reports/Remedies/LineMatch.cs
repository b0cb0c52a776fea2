namespace Auditor.Reports.Remedies;

/// <summary>Pairs the lines of two texts that differ in few lines.</summary>
internal static class LineMatch
{
    /// <summary>
    /// The steps from one text to the other, in order: pairs of the numbers of equal lines, and with -1 on the other side lines that one of
    /// them has alone, the earlier ones first.
    /// </summary>
    public static IReadOnlyList<(int Old, int Young)> Common(List<string> old, List<string> young)
    {
        var steps = new List<(int, int)>();
        var (i, j) = (0, 0);
        while (i < old.Count || j < young.Count)
        {
            if (i < old.Count && j < young.Count && old[i] == young[j])
            {
                steps.Add((i++, j++));
                continue;
            }

            var (oldEnd, youngEnd) = Meeting(old, i, young, j);
            for (; i < oldEnd; i++)
            {
                steps.Add((i, -1));
            }

            for (; j < youngEnd; j++)
            {
                steps.Add((-1, j));
            }
        }

        return steps;
    }

    /// <summary>Where the texts meet again with the fewest lines passed over; their ends where they never do.</summary>
    private static (int Old, int Young) Meeting(List<string> old, int i, List<string> young, int j)
    {
        var most = old.Count - i + young.Count - j;
        for (var passed = 1; passed <= most; passed++)
        {
            for (var inOld = Math.Min(passed, old.Count - i); inOld >= Math.Max(0, passed - (young.Count - j)); inOld--)
            {
                var (one, other) = (i + inOld, j + passed - inOld);
                if (one < old.Count && other < young.Count && old[one] == young[other])
                {
                    return (one, other);
                }
            }
        }

        return (old.Count, young.Count);
    }
}
