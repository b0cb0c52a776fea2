using System.Numerics;

namespace Auditor.Engine.Comparisons;

/// <summary>A set of changes, by their numbers. Never altered once made, so that many may share one.</summary>
internal sealed class ChangeBits
{
    private readonly ulong[] _words;

    private ChangeBits(ulong[] words) => _words = words;

    /// <summary>The empty set.</summary>
    public static ChangeBits None { get; } = new([]);

    /// <summary>The numbers in the set, ascending.</summary>
    public IEnumerable<int> Numbers
    {
        get
        {
            for (var i = 0; i < _words.Length; i++)
            {
                for (var rest = _words[i]; rest != 0; rest &= rest - 1)
                {
                    yield return (i * 64) + BitOperations.TrailingZeroCount(rest);
                }
            }
        }
    }

    /// <summary>The set of one.</summary>
    public static ChangeBits Of(int number)
    {
        var words = new ulong[(number / 64) + 1];
        words[^1] = 1UL << (number % 64);
        return new ChangeBits(words);
    }

    /// <summary>What is in either set.</summary>
    public ChangeBits Or(ChangeBits other)
    {
        if (Holds(other))
        {
            return this;
        }

        var words = new ulong[Math.Max(_words.Length, other._words.Length)];
        _words.CopyTo(words, 0);
        for (var i = 0; i < other._words.Length; i++)
        {
            words[i] |= other._words[i];
        }

        return new ChangeBits(words);
    }

    private bool Holds(ChangeBits other)
    {
        for (var i = 0; i < other._words.Length; i++)
        {
            if ((other._words[i] & ~(i < _words.Length ? _words[i] : 0)) != 0)
            {
                return false;
            }
        }

        return true;
    }
}
