using YamlDotNet.Core;
using YamlDotNet.Core.Events;

namespace Auditor.Documents;

/// <summary>The event stream of a text, with offsets as spans.</summary>
/// <param name="source">The text to parse.</param>
internal sealed class YamlEvents(SourceText source)
{
    private readonly Parser _parser = new(new Scanner(new StringReader(source.Text), skipComments: true));

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
        return new SourceSpan(source, start, Math.Max(start, end));
    }

    private int Offset(Mark mark) => (int)Math.Clamp(mark.Index, 0, source.Text.Length);
}
