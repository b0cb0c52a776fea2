namespace Auditor.Engine.Departures;

/// <summary>
/// A key of a subject in which each <c>*</c> stands for any number of characters, also none. Each stretch between two of them is looked
/// for once, from left to right, so that no pattern takes long.
/// </summary>
public sealed class SubjectPattern
{
    private readonly string[] _parts;

    /// <summary>Makes the pattern.</summary>
    /// <param name="text">The pattern as written.</param>
    public SubjectPattern(string text) => _parts = text.Split('*');

    /// <summary>Whether a key is what the pattern says.</summary>
    public bool Fits(string key)
    {
        if (_parts is [var whole])
        {
            return key == whole;
        }

        var (first, last) = (_parts[0], _parts[^1]);
        if (key.Length < first.Length + last.Length || !key.StartsWith(first, StringComparison.Ordinal) || !key.EndsWith(last, StringComparison.Ordinal))
        {
            return false;
        }

        var rest = key.AsSpan(first.Length, key.Length - first.Length - last.Length);
        foreach (var part in _parts.AsSpan(1, _parts.Length - 2))
        {
            var at = rest.IndexOf(part, StringComparison.Ordinal);
            if (at < 0)
            {
                return false;
            }

            rest = rest[(at + part.Length)..];
        }

        return true;
    }
}
