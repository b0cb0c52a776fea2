using System.Buffers;

namespace Auditor.Documents;

/// <summary>
/// Characters that have no place in a design file: control characters but tab, CR and LF; the Unicode line separators, which
/// editors count as lines and others do not; characters that stand for no character; halves of a surrogate pair.
/// </summary>
internal static class ForbiddenCharacters
{
    private static readonly SearchValues<char> Suspects = SearchValues.Create(
        [.. Enumerable.Range(0, 0x10000).Select(code => (char)code).Where(c => IsForbidden(c) || char.IsSurrogate(c))]);

    /// <summary>Returns the index of the first forbidden character, or -1.</summary>
    public static int FirstIn(ReadOnlySpan<char> text)
    {
        var from = 0;
        while (text[from..].IndexOfAny(Suspects) is var step and >= 0)
        {
            var at = from + step;
            if (!(at + 1 < text.Length && char.IsSurrogatePair(text[at], text[at + 1])))
            {
                return at;
            }

            from = at + 2;
        }

        return -1;
    }

    /// <summary>Reports the first forbidden character of a text.</summary>
    /// <returns>Whether there was one.</returns>
    public static bool Report(SourceText source, Problems problems)
    {
        var at = FirstIn(source.Text);
        if (at >= 0)
        {
            problems.Add(ReadingProblems.ForbiddenCharacter(new SourceSpan(source, at, at + 1)));
        }

        return at >= 0;
    }

    private static bool IsForbidden(char c)
        => (char.IsControl(c) && c is not ('\t' or '\r' or '\n')) || c is '\u2028' or '\u2029' or '\uFEFF' or '\uFFFE' or '\uFFFF';
}
