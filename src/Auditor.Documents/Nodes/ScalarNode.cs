namespace Auditor.Documents;

/// <summary>A single value: a text, a number, a flag or nothing.</summary>
public sealed class ScalarNode : Node
{
    private readonly double _number;
    private string? _text;

    /// <summary>What <see cref="ScalarPlaces"/> finds, once somebody asked; empty where the text is just what stands in the source.</summary>
    private int[]? _offsets;

    /// <summary>Makes a scalar.</summary>
    /// <param name="span">Where it stands.</param>
    /// <param name="text">Its text, without quotes and with escapes resolved.</param>
    /// <param name="kind">What the text is to be taken for.</param>
    /// <param name="number">The number, for a scalar of that kind.</param>
    public ScalarNode(SourceSpan span, string text, ScalarKind kind, double number = 0)
        : base(span)
    {
        _text = text;
        Kind = kind;
        _number = number;
    }

    /// <summary>Makes a text that is just what stands in the source; it is cut out when somebody asks for it.</summary>
    internal ScalarNode(SourceSpan span)
        : base(span) => Kind = ScalarKind.Text;

    /// <summary>The text as written, without quotes and with escapes resolved, whatever the kind.</summary>
    public string Text => _text ??= Span.Text;

    /// <summary>What the text is to be taken for.</summary>
    public ScalarKind Kind { get; }

    /// <summary>The number.</summary>
    /// <exception cref="InvalidOperationException">The scalar is not a number.</exception>
    public double Number => Kind == ScalarKind.Number ? _number : throw new InvalidOperationException("the scalar is not a number");

    /// <summary>The flag.</summary>
    /// <exception cref="InvalidOperationException">The scalar is not a flag.</exception>
    public bool Flag => Kind == ScalarKind.Flag
        ? string.Equals(Text, "true", StringComparison.OrdinalIgnoreCase)
        : throw new InvalidOperationException("the scalar is not a flag");

    /// <summary>
    /// Finds the offset in the source of a character of <see cref="Text"/>. Exact for plain, quoted and block scalars alike; a blank
    /// that stands for a line break gives the place of the break.
    /// </summary>
    /// <param name="indexInText">An index from 0 to the length of the text; the length gives the place after the last character.</param>
    /// <exception cref="ArgumentOutOfRangeException">The index lies outside the text.</exception>
    public int OffsetOf(int indexInText)
    {
        ArgumentOutOfRangeException.ThrowIfNegative(indexInText);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(indexInText, Text.Length);
        var offsets = _offsets ??= ScalarPlaces.Of(this) ?? [];
        return offsets.Length == 0 ? Span.Start + indexInText : offsets[indexInText];
    }

    /// <summary>Returns the stretch of the source that holds a part of <see cref="Text"/>.</summary>
    /// <param name="start">The index in the text where the part starts.</param>
    /// <param name="length">How many characters the part has.</param>
    public SourceSpan SpanOf(int start, int length)
    {
        var from = OffsetOf(start);
        var to = length == 0 ? from : Math.Max(OffsetOf(start + length - 1) + 1, from);
        return new SourceSpan(Span.Source, from, Math.Min(to, Span.End));
    }
}
