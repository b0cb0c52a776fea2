using YamlDotNet.Core;
using YamlDotNet.Core.Events;

namespace Auditor.Documents;

/// <summary>The event stream of a text, with offsets as spans.</summary>
/// <param name="source">The text to parse.</param>
internal sealed class YamlEvents(SourceText source)
{
    private readonly Parser _parser = new(new Scanner(new StringReader(source.Text), skipComments: true));

    /// <summary>How far the events read so far reach into the text.</summary>
    public int Position { get; private set; }

    /// <summary>The event to deal with next.</summary>
    public ParsingEvent Current => _parser.Current ?? throw new InvalidOperationException("the events are at their end");

    /// <summary>Moves to the next event.</summary>
    public void Advance()
    {
        if (_parser.MoveNext())
        {
            Position = Math.Max(Position, Offset(Current.End));
        }
    }

    public SourceSpan SpanOf(ParsingEvent item) => new(source, Offset(item.Start), Math.Max(Offset(item.Start), Offset(item.End)));

    private int Offset(Mark mark) => (int)Math.Clamp(mark.Index, 0, source.Text.Length);
}
