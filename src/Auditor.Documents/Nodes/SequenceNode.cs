namespace Auditor.Documents;

/// <summary>A sequence of values.</summary>
/// <param name="span">Where it stands.</param>
/// <param name="items">Its items in the order of the file.</param>
public sealed class SequenceNode(SourceSpan span, IReadOnlyList<Node> items) : Node(span)
{
    /// <summary>The items in the order of the file.</summary>
    public IReadOnlyList<Node> Items { get; } = items;
}
