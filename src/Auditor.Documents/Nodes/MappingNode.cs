namespace Auditor.Documents;

/// <summary>A mapping of keys to values; no key occurs twice.</summary>
public sealed class MappingNode : Node
{
    /// <summary>Up to so many entries are looked through one by one: faster than an index, and smaller.</summary>
    private const int MostWithoutIndex = 8;

    private readonly MappingEntry[] _entries;
    private readonly Dictionary<string, MappingEntry>? _byKey;

    /// <summary>Makes a mapping.</summary>
    /// <param name="span">Where it stands.</param>
    /// <param name="entries">Its entries in the order of the file.</param>
    /// <exception cref="ArgumentException">A key occurs twice.</exception>
    public MappingNode(SourceSpan span, IReadOnlyList<MappingEntry> entries)
        : base(span)
    {
        _entries = [.. entries];
        if (_entries.Length > MostWithoutIndex)
        {
            _byKey = _entries.ToDictionary(entry => entry.Key.Value, StringComparer.Ordinal);
        }
        else if (Array.Exists(_entries, entry => !ReferenceEquals(Entry(entry.Key.Value), entry)))
        {
            throw new ArgumentException("a key occurs twice", nameof(entries));
        }
    }

    /// <summary>The entries in the order of the file.</summary>
    public IReadOnlyList<MappingEntry> Entries => _entries;

    /// <summary>Returns the value of a key, or null when the mapping lacks the key. Takes constant time.</summary>
    public Node? Find(string key) => Entry(key)?.Value;

    /// <summary>Returns the entry of a key, or null when the mapping lacks the key. Takes constant time.</summary>
    public MappingEntry? Entry(string key)
    {
        if (_byKey is not null)
        {
            return _byKey.GetValueOrDefault(key);
        }

        foreach (var entry in _entries)
        {
            if (entry.Key.Value == key)
            {
                return entry;
            }
        }

        return null;
    }
}
