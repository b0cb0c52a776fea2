namespace Auditor.Documents;

/// <summary>The keys of a mapping that is being read, with their places.</summary>
internal sealed class KeyPlaces
{
    /// <summary>Up to so many keys are looked through one by one: most mappings are small, and need no index.</summary>
    private const int MostWithoutIndex = 8;

    private readonly List<Located<string>> _keys = [];
    private Dictionary<string, SourceSpan>? _index;

    /// <summary>Takes a key; gives the place of the same key before it, or null where it is the first.</summary>
    public SourceSpan? Add(Located<string> key)
    {
        if (_index is not null)
        {
            return _index.TryAdd(key.Value, key.Span) ? null : _index[key.Value];
        }

        foreach (var known in _keys)
        {
            if (known.Value == key.Value)
            {
                return known.Span;
            }
        }

        _keys.Add(key);
        if (_keys.Count > MostWithoutIndex)
        {
            _index = _keys.ToDictionary(known => known.Value, known => known.Span, StringComparer.Ordinal);
        }

        return null;
    }
}
