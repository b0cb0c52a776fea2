using System.Runtime.InteropServices;

namespace Auditor.Documents;

/// <summary>A stretch of a source text, as half-open offsets; line and column are worked out only when shown.</summary>
/// <param name="Source">The text that the stretch lies in.</param>
/// <param name="Start">The offset of the first character.</param>
/// <param name="End">The offset after the last character; equal to <paramref name="Start"/> for an empty stretch.</param>
[StructLayout(LayoutKind.Auto)]
public readonly record struct SourceSpan(SourceText Source, int Start, int End)
{
    /// <summary>How many UTF-16 code units the stretch has.</summary>
    public int Length => End - Start;

    /// <summary>The line and column of the first character.</summary>
    public Location StartLocation => Source.LocationOf(Start);

    /// <summary>The line and column after the last character.</summary>
    public Location EndLocation => Source.LocationOf(End);

    /// <summary>The characters of the stretch.</summary>
    public string Text => Source.Text[Start..End];

    /// <summary>Returns a part of the stretch, cut to its bounds.</summary>
    /// <param name="start">Where the part starts, counted from the start of this stretch.</param>
    /// <param name="length">How many characters the part has.</param>
    public SourceSpan Slice(int start, int length)
    {
        var from = Start + Math.Clamp(start, 0, Length);
        return new SourceSpan(Source, from, from + Math.Clamp(length, 0, End - from));
    }

    /// <summary>Returns the stretch as <c>path:line:column</c>.</summary>
    public override string ToString() => $"{Source.Path}:{StartLocation}";
}
