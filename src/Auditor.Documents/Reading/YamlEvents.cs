using YamlDotNet.Core;
using YamlDotNet.Core.Events;

namespace Auditor.Documents;

/// <summary>The event stream of a text, with offsets as spans.</summary>
internal sealed class YamlEvents : IDisposable
{
    /// <summary>In a text with so many characters tokens are looked for by another thread while events are made of them.</summary>
    public const int LongText = 1 << 17;

    private readonly SourceText _source;
    private readonly TokensAhead? _ahead;
    private readonly Parser _parser;

    /// <summary>Begins with a text.</summary>
    public YamlEvents(SourceText source)
    {
        _source = source;
        _ahead = source.Text.Length < LongText ? null : new TokensAhead(source.Text);
        _parser = new Parser(_ahead ?? (IScanner)new Scanner(new StringReader(source.Text), skipComments: true));
    }

    /// <summary>How far the events before the current one reach into the text.</summary>
    public int Position { get; private set; }

    /// <summary>The event to deal with next.</summary>
    public ParsingEvent Current => _parser.Current ?? throw new InvalidOperationException("the events are at their end");

    /// <summary>Moves to the next event.</summary>
    public void Advance()
    {
        if (_parser.Current is { } passed)
        {
            Position = Math.Max(Position, SpanOf(passed).End);
        }

        _parser.MoveNext();
    }

    /// <summary>
    /// Where an event of the text stands. A value that is nothing stands nowhere before what was read so far, wherever the parser places it.
    /// </summary>
    public SourceSpan SpanOf(ParsingEvent item)
    {
        var (start, end) = (Offset(item.Start), Offset(item.End));
        start = start == end && item is Scalar ? Math.Max(start, Position) : start;
        return new SourceSpan(_source, start, Math.Max(start, end));
    }

    /// <summary>Needs no more events.</summary>
    public void Dispose() => _ahead?.Dispose();

    private int Offset(Mark mark) => (int)Math.Clamp(mark.Index, 0, _source.Text.Length);
}
