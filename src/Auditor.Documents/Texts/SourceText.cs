namespace Auditor.Documents;

/// <summary>The text of one file, able to turn an offset into a line and a column.</summary>
/// <param name="path">The path to show: relative, with forward slashes, never a path of the machine.</param>
/// <param name="text">The whole text, without a byte order mark.</param>
public sealed class SourceText(string path, string text)
{
    private readonly Lazy<int[]> _lineStarts = new(() => FindLineStarts(text));

    /// <summary>The path to show in messages and reports.</summary>
    public string Path { get; } = path;

    /// <summary>The whole text.</summary>
    public string Text { get; } = text;

    /// <summary>How many lines the text has; an empty text has one.</summary>
    public int LineCount => _lineStarts.Value.Length;

    /// <summary>Finds the line and column of an offset.</summary>
    /// <param name="offset">An offset from 0 to the length of the text.</param>
    /// <exception cref="ArgumentOutOfRangeException">The offset lies outside the text.</exception>
    public Location LocationOf(int offset)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(offset);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(offset, Text.Length);
        var found = Array.BinarySearch(_lineStarts.Value, offset);
        var index = found >= 0 ? found : ~found - 1;
        return new Location(index + 1, offset - _lineStarts.Value[index] + 1);
    }

    /// <summary>Returns a line without its line break.</summary>
    /// <param name="line">The line, counted from 1.</param>
    /// <exception cref="ArgumentOutOfRangeException">The text has no such line.</exception>
    public string LineAt(int line)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(line, 1);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(line, LineCount);
        var starts = _lineStarts.Value;
        var end = line < starts.Length ? starts[line] : Text.Length;
        return Text.AsSpan(starts[line - 1], end - starts[line - 1]).TrimEnd("\r\n").ToString();
    }

    /// <summary>Returns the span of the whole text.</summary>
    public SourceSpan WholeSpan() => new(this, 0, Text.Length);

    private static int[] FindLineStarts(string text)
    {
        var starts = new List<int> { 0 };
        for (var i = 0; i < text.Length; i++)
        {
            if (text[i] == '\n' || (text[i] == '\r' && (i + 1 == text.Length || text[i + 1] != '\n')))
            {
                starts.Add(i + 1);
            }
        }

        return [.. starts];
    }
}
