namespace Auditor.Engine.Evidence;

/// <summary>Foundations, each once, in the order of kind, subject and name. Sets of one <see cref="FoundationSets"/> are equal only where they are the same.</summary>
/// <param name="items">The foundations.</param>
internal sealed class FoundationSet(IReadOnlyList<Foundation> items)
{
    /// <summary>The set that holds nothing.</summary>
    public static FoundationSet None { get; } = new([]);

    /// <summary>The foundations.</summary>
    public IReadOnlyList<Foundation> Items { get; } = items;
}
