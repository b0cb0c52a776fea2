namespace Auditor.Documents;

/// <summary>A value of a YAML document, with the place that states it.</summary>
/// <param name="span">From the first to after the last character of the value.</param>
public abstract class Node(SourceSpan span)
{
    /// <summary>
    /// Where the value stands: a scalar with its quotes, a bracketed collection with its brackets, a block collection from its
    /// first key or dash to the end of its last value.
    /// </summary>
    public SourceSpan Span { get; } = span;

    /// <summary>Whether a part of the value was refused, so that what seems to be missing from it may merely be unread.</summary>
    public bool IsPartial { get; internal init; }
}
