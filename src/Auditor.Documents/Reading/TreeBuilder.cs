using YamlDotNet.Core.Events;

namespace Auditor.Documents;

/// <summary>Builds the tree of one document from its events. Recursion is bounded by the limit on nesting.</summary>
/// <param name="events">The events, none of them read yet.</param>
/// <param name="source">The text that they come from.</param>
/// <param name="problems">Receives whatever is refused.</param>
/// <param name="budget">What may still be read.</param>
internal sealed class TreeBuilder(YamlEvents events, SourceText source, Problems problems, ReadingBudget budget)
{
    private readonly Stack<SourceSpan?> _openCollections = new();

    /// <summary>The innermost bracket or brace that is still open.</summary>
    public SourceSpan? OpenBracket => _openCollections.TryPeek(out var bracket) ? bracket : null;

    /// <summary>Reads the only document of the stream.</summary>
    /// <param name="nesting">How many collections already lie around it.</param>
    /// <returns>The root value, or null when it was refused.</returns>
    /// <exception cref="UnreadableException">The document cannot be read to its end.</exception>
    public Node? ReadDocument(int nesting)
    {
        events.Advance();
        events.Advance();
        if (events.Current is not DocumentStart document)
        {
            throw new UnreadableException(ReadingProblems.Empty(source));
        }

        if (document.Version is not null)
        {
            problems.Add(ReadingProblems.Directive(events.SpanOf(document)));
        }

        events.Advance();
        var root = ReadValue(nesting);
        events.Advance();
        return events.Current is StreamEnd ? root : throw new UnreadableException(ReadingProblems.SecondDocument(events.SpanOf(events.Current)));
    }

    /// <summary>Reads the value at the current event and moves past it.</summary>
    /// <returns>The value, or null when it was refused.</returns>
    private Node? ReadValue(int nesting)
    {
        var at = events.Current;
        if (!budget.TrySpendValue())
        {
            throw new UnreadableException(ReadingProblems.TooManyValues(events.SpanOf(at), budget.Limits.Values));
        }

        if (at is AnchorAlias)
        {
            problems.Add(ReadingProblems.Alias(events.SpanOf(at)));
            events.Advance();
            return null;
        }

        if (at is not NodeEvent node)
        {
            throw new InvalidOperationException("the parser leaves out a value");
        }

        if (!node.Anchor.IsEmpty)
        {
            problems.Add(ReadingProblems.Anchor(ScalarTags.PropertiesOf(events.SpanOf(at))));
        }

        if (at is Scalar scalar)
        {
            events.Advance();
            return ScalarTags.Resolve(scalar, events.SpanOf(scalar), problems);
        }

        if (nesting >= budget.Limits.Nesting)
        {
            throw new UnreadableException(ReadingProblems.TooDeep(events.SpanOf(at), budget.Limits.Nesting));
        }

        ScalarTags.CheckCollection(node, events.SpanOf(at), problems);
        return at is MappingStart ? ReadMapping(nesting + 1) : ReadSequence(nesting + 1);
    }

    private MappingNode ReadMapping(int nesting)
    {
        var start = OpenCollection();
        var entries = new List<MappingEntry>();
        var places = new KeyPlaces();
        var partial = false;
        while (events.Current is not MappingEnd)
        {
            var key = ReadKey(nesting);
            var value = ReadValue(nesting);
            if (key is not { } name || value is null)
            {
                partial = true;
            }
            else if (places.Add(name) is { } before)
            {
                problems.Add(ReadingProblems.DuplicateKey(name, before));
            }
            else
            {
                entries.Add(new MappingEntry(name, value));
            }
        }

        var span = CloseCollection(start, entries.Count == 0 ? start : entries[^1].Value.Span.End);
        return new MappingNode(span, entries) { IsPartial = partial };
    }

    private Located<string>? ReadKey(int nesting)
    {
        var span = events.SpanOf(events.Current);
        var isScalar = events.Current is Scalar;
        var value = ReadValue(nesting);
        if (!isScalar)
        {
            if (value is not null)
            {
                problems.Add(ReadingProblems.KeyIsNoText(value.Span));
            }

            return null;
        }

        if (value is ScalarNode { Text: "<<" })
        {
            problems.Add(ReadingProblems.MergeKey(span));
            return null;
        }

        return value is ScalarNode scalar ? new Located<string>(scalar.Text, scalar.Span) : null;
    }

    private SequenceNode ReadSequence(int nesting)
    {
        var start = OpenCollection();
        var items = new List<Node>();
        var partial = false;
        while (events.Current is not SequenceEnd)
        {
            if (ReadValue(nesting) is { } item)
            {
                items.Add(item);
            }
            else
            {
                partial = true;
            }
        }

        var span = CloseCollection(start, items.Count == 0 ? start : items[^1].Span.End);
        return new SequenceNode(span, items) { IsPartial = partial };
    }

    private int OpenCollection()
    {
        var span = events.SpanOf(events.Current);
        var at = span.Start + ScalarTags.PropertiesLength(source.Text.AsSpan(span.Start, span.Length));
        var bracket = events.Current switch
        {
            MappingStart { Style: MappingStyle.Flow } => '{',
            SequenceStart { Style: SequenceStyle.Flow } => '[',
            _ => default(char?),
        };
        var isBracket = at < source.Text.Length && source.Text[at] == bracket;
        _openCollections.Push(isBracket ? new SourceSpan(source, at, at + 1) : null);
        events.Advance();

        // The mapping of a lone pair inside brackets has none of its own; the parser lets it start anywhere before its key.
        return bracket is null || isBracket ? span.Start : events.SpanOf(events.Current).Start;
    }

    /// <summary>Moves past the end of a collection: its closing bracket, or for a block collection the end of its last value.</summary>
    private SourceSpan CloseCollection(int start, int lastEnd)
    {
        var end = events.SpanOf(events.Current).Start;
        var isBracket = _openCollections.Pop() is not null;
        events.Advance();
        return new SourceSpan(source, start, isBracket ? Math.Min(end + 1, source.Text.Length) : lastEnd);
    }
}
