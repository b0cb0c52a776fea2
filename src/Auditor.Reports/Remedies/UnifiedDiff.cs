using System.Text;

namespace Auditor.Reports.Remedies;

/// <summary>Writes the difference of two texts as a unified diff, as <c>git apply</c> and <c>patch</c> read it.</summary>
public static class UnifiedDiff
{
    private const int Context = 3;
    private const string NoLineEnd = "\\ No newline at end of file\n";

    /// <summary>Writes the difference; empty where there is none.</summary>
    /// <param name="path">Path of the file, relative to where the diff is to be applied.</param>
    /// <param name="before">The earlier text.</param>
    /// <param name="after">The later text.</param>
    public static string Write(string path, string before, string after)
    {
        var (old, young) = (Lines(before), Lines(after));
        var common = LineMatch.Common(old, young);
        var text = new StringBuilder();
        foreach (var (from, to) in Hunks(common))
        {
            Hunk(text, old, young, common, from, to);
        }

        return text.Length == 0 ? "" : $"--- a/{path}\n+++ b/{path}\n{text}";
    }

    /// <summary>Lines with their ends.</summary>
    private static List<string> Lines(string text)
    {
        var lines = new List<string>();
        for (var at = 0; at < text.Length;)
        {
            var end = text.IndexOf('\n', at);
            end = end < 0 ? text.Length : end + 1;
            lines.Add(text[at..end]);
            at = end;
        }

        return lines;
    }

    /// <summary>Stretches of the steps from one text to the other that hold changes and their surroundings.</summary>
    private static List<(int From, int To)> Hunks(IReadOnlyList<(int Old, int Young)> steps)
    {
        var changed = Enumerable.Range(0, steps.Count).Where(i => steps[i].Old < 0 || steps[i].Young < 0).ToArray();
        var hunks = new List<(int From, int To)>();
        foreach (var step in changed)
        {
            var (from, to) = (Math.Max(0, step - Context), Math.Min(steps.Count, step + Context + 1));
            if (hunks.Count > 0 && from <= hunks[^1].To)
            {
                hunks[^1] = (hunks[^1].From, to);
            }
            else
            {
                hunks.Add((from, to));
            }
        }

        return hunks;
    }

    private static void Hunk(StringBuilder text, List<string> old, List<string> young, IReadOnlyList<(int Old, int Young)> steps, int from, int to)
    {
        var (oldBefore, youngBefore) = (steps.Take(from).Count(step => step.Old >= 0), steps.Take(from).Count(step => step.Young >= 0));
        var within = steps.Skip(from).Take(to - from).ToArray();
        var (oldLines, youngLines) = (within.Count(step => step.Old >= 0), within.Count(step => step.Young >= 0));
        text.Append($"@@ -{Start(oldBefore, oldLines)},{oldLines} +{Start(youngBefore, youngLines)},{youngLines} @@\n");
        foreach (var (one, other) in within)
        {
            var (sign, line) = (one, other) switch
            {
                ( >= 0, >= 0) => (' ', old[one]),
                ( >= 0, _) => ('-', old[one]),
                _ => ('+', young[other]),
            };
            text.Append(sign).Append(line);
            if (!line.EndsWith('\n'))
            {
                text.Append('\n').Append(NoLineEnd);
            }
        }
    }

    /// <summary>A hunk without lines of a text stands after the line before it.</summary>
    private static int Start(int before, int lines) => lines == 0 ? before : before + 1;
}
