namespace Auditor.Documents;

/// <summary>Walks a scalar as written alongside its text, to find where each character of the text stands.</summary>
internal static class ScalarPlaces
{
    /// <summary>The offset in the source of each character of the text, and of the place after the last; null where they follow the start one by one.</summary>
    public static int[]? Of(ScalarNode scalar)
    {
        var written = scalar.Span.Source.Text.AsSpan(scalar.Span.Start, scalar.Span.Length);
        var text = scalar.Text;
        if (written.SequenceEqual(text))
        {
            return null;
        }

        var offsets = new int[text.Length + 1];
        var properties = ScalarTags.PropertiesLength(written);
        var quote = properties < written.Length ? written[properties] : '\0';
        var at = properties + StartOfContent(written[properties..]);
        for (var i = 0; i < text.Length; i++)
        {
            at = At(written, text, i, at);
            offsets[i] = scalar.Span.Start + at;
            at = IsFirstOfEscapedPair(written, text, i, at) ? at : After(written, at, quote);
        }

        offsets[^1] = scalar.Span.Start + at;
        return offsets;
    }

    private static int StartOfContent(ReadOnlySpan<char> written)
    {
        if (written.IsEmpty || written[0] is not ('|' or '>'))
        {
            return !written.IsEmpty && written[0] is '"' or '\'' ? 1 : 0;
        }

        var lineEnd = written.IndexOfAny('\r', '\n');
        return lineEnd < 0 ? written.Length : AfterBreak(written, lineEnd);
    }

    /// <summary>Steps over indentation and line breaks to the character itself; a blank or break of the text matches the first one met.</summary>
    private static int At(ReadOnlySpan<char> written, string text, int index, int at)
    {
        if (char.IsWhiteSpace(text[index]))
        {
            return at;
        }

        while (at < written.Length && written[at] != text[index] && char.IsWhiteSpace(written[at]))
        {
            at++;
        }

        return at;
    }

    private static int After(ReadOnlySpan<char> written, int at, char quote)
    {
        if (at >= written.Length)
        {
            return written.Length;
        }

        return (quote, written[at]) switch
        {
            ('"', '\\') => Math.Min(written.Length, at + EscapeLength(written, at)),
            ('\'', '\'') => Math.Min(written.Length, at + 2),
            (_, '\r' or '\n') => AfterBreak(written, at),
            _ => at + 1,
        };
    }

    /// <summary>Whether a character is the first half of a pair that one escape stands for.</summary>
    private static bool IsFirstOfEscapedPair(ReadOnlySpan<char> written, string text, int index, int at)
        => char.IsHighSurrogate(text[index]) && written[at..].StartsWith("\\U");

    private static int EscapeLength(ReadOnlySpan<char> written, int at) => (at + 1 < written.Length ? written[at + 1] : '\0') switch
    {
        'x' => 4,
        'u' => 6,
        'U' => 10,
        _ => 2,
    };

    private static int AfterBreak(ReadOnlySpan<char> written, int at)
        => at + (written[at] == '\r' && at + 1 < written.Length && written[at + 1] == '\n' ? 2 : 1);
}
