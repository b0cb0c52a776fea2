using System.Text;

namespace Auditor.Documents;

/// <summary>Shows the line that a span starts on, with a mark under the span.</summary>
internal static class SourceExcerpt
{
    private const int Widest = 100;
    private const int Before = 40;

    /// <summary>Appends two lines: the text and the mark. Appends nothing for an empty text.</summary>
    /// <param name="output">Receives the lines.</param>
    /// <param name="span">What to mark; of a stretch of several lines, the part on the first.</param>
    /// <param name="margin">The width of the column of line numbers.</param>
    public static void Append(StringBuilder output, SourceSpan span, int margin)
    {
        if (span.Source.Text.Length == 0)
        {
            return;
        }

        var place = span.StartLocation;
        var line = span.Source.LineAt(place.Line);
        var start = Math.Min(place.Column - 1, line.Length);
        var end = Math.Min(line.Length, start + span.Length);
        var (shown, column, length) = Window(line, start, end);
        output.Append(place.Line.ToString().PadLeft(margin)).Append(" | ").Append(shown.TrimEnd()).Append('\n');
        output.Append(' ', margin).Append(" | ").Append(' ', column).Append('^', Math.Max(1, length)).Append('\n');
    }

    /// <summary>Cuts a long line around the mark, and the mark to what is left.</summary>
    private static (string Shown, int Column, int Length) Window(string line, int start, int end)
    {
        // A line may be as long as the file: only the surroundings of the mark are looked at.
        var from = Math.Max(0, start - (2 * Widest));
        var to = Math.Min(line.Length, start + (2 * Widest));
        var before = ShownText.Of(line.AsSpan(from, start - from)).Width;
        var marked = ShownText.Of(line.AsSpan(start, Math.Min(end, to) - start)).Width;
        var cells = ShownText.Of(line.AsSpan(from, to - from));
        if (from == 0 && to == line.Length && cells.Width <= Widest)
        {
            return (cells.ToString(), before, marked);
        }

        var left = before + marked <= Widest && from == 0 ? 0 : Math.Max(0, before - Before);
        var isCutLeft = left > 0 || from > 0;
        var isCutRight = left + Widest < cells.Width || to < line.Length;
        var shown = cells.Cut(left, Widest);
        var column = before - left;
        return ((isCutLeft ? "…" : "") + shown + (isCutRight ? "…" : ""), column + (isCutLeft ? 1 : 0), Math.Min(marked, Widest - column));
    }
}
