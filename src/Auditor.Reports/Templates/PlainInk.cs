using System.Text;

namespace Auditor.Reports.Templates;

/// <summary>Plain text of at most 100 columns.</summary>
internal sealed class PlainInk : Ink
{
    private const int Columns = 100;
    private const int WidestLabel = 32;

    public override string Inert(string text, bool startsBlock) => OneLine(text);

    public override string Code(string text) => OneLine(text);

    /// <summary>
    /// Wraps long lines at blanks. A wrapped line goes on under its first word; after a dash, or after a label that two blanks or more
    /// set off, under what follows.
    /// </summary>
    public override string Finish(string text)
    {
        var wrapped = new StringBuilder(text.Length);
        var lines = text.TrimEnd('\n').Split('\n');
        foreach (var line in lines)
        {
            Wrap(line.TrimEnd(' '), wrapped);
        }

        return wrapped.ToString();
    }

    private static void Wrap(string line, StringBuilder wrapped)
    {
        var hang = line.Length > Columns ? HangOf(line) : 0;
        var at = 0;
        var indent = 0;
        while (line.Length - at > Columns - indent && BreakIn(line, at, at == 0 ? hang : at, at + Columns - indent) is var stop and > 0)
        {
            wrapped.Append(line, at, stop - at).Append('\n').Append(' ', hang);
            (at, indent) = (stop + 1, hang);
        }

        wrapped.Append(line, at, line.Length - at).Append('\n');
    }

    /// <summary>Where to break: the last blank that keeps the line within bounds, else the first blank after; 0 for none.</summary>
    private static int BreakIn(string line, int start, int from, int bound)
    {
        var last = line.LastIndexOf(' ', bound, bound - start);
        return last > from ? last : Math.Max(0, line.IndexOf(' ', Math.Max(bound, from + 1)));
    }

    private static int HangOf(string line)
    {
        var indent = line.Length - line.AsSpan().TrimStart(' ').Length;
        if (line.AsSpan(indent).StartsWith("- "))
        {
            return indent + 2;
        }

        var gap = line.IndexOf("  ", indent, StringComparison.Ordinal);
        return gap < 0 || gap > WidestLabel ? indent : line.Length - line.AsSpan(gap).TrimStart(' ').Length;
    }
}
