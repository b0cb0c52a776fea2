namespace Auditor.Documents;

/// <summary>A mapping of keys to values; no key occurs twice.</summary>
public sealed class MappingNode : Node
{
    private readonly Dictionary<string, MappingEntry> _byKey;

    /// <summary>Makes a mapping.</summary>
    /// <param name="span">Where it stands.</param>
    /// <param name="entries">Its entries in the order of the file.</param>
    /// <exception cref="ArgumentException">A key occurs twice.</exception>
    public MappingNode(SourceSpan span, IReadOnlyList<MappingEntry> entries)
        : base(span)
    {
        Entries = entries;
        _byKey = entries.ToDictionary(entry => entry.Key.Value, StringComparer.Ordinal);
    }

    /// <summary>The entries in the order of the file.</summary>
    public IReadOnlyList<MappingEntry> Entries { get; }

    /// <summary>Returns the value of a key, or null when the mapping lacks the key. Takes constant time.</summary>
    public Node? Find(string key) => Entry(key)?.Value;

    /// <summary>Returns the entry of a key, or null when the mapping lacks the key. Takes constant time.</summary>
    public MappingEntry? Entry(string key) => _byKey.GetValueOrDefault(key);
}
