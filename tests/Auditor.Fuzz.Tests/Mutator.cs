namespace Auditor.Fuzz.Tests;

/// <summary>
/// Makes bad inputs out of good ones, always the same from the same seed. Half of them are changed by lines, words and digits alone:
/// they mostly keep their form, and so come through to what reads the sense.
/// </summary>
/// <param name="seeds">Good inputs of one kind.</param>
/// <param name="random">The source of chance.</param>
internal sealed class Mutator(IReadOnlyList<byte[]> seeds, Random random)
{
    /// <summary>No input is longer.</summary>
    public const int MostBytes = 200_000;

    private const int MostChanges = 4;

    /// <summary>The next bad input.</summary>
    public byte[] Next()
    {
        var bytes = seeds[random.Next(seeds.Count)].ToList();
        if (random.Next(2) == 0)
        {
            Repeat(1 + random.Next(MostChanges), () => ChangeForm(bytes));
        }
        else
        {
            Repeat(1 + random.Next(MostChanges / 2), () => ChangeSense(bytes));
        }

        return bytes.Count > MostBytes ? [.. bytes.Take(MostBytes)] : [.. bytes];
    }

    private void ChangeForm(List<byte> bytes)
    {
        var at = random.Next(bytes.Count + 1);
        var length = Math.Min(bytes.Count - at, 1 << random.Next(10));
        switch (random.Next(9))
        {
            case 0 when at < bytes.Count:
                bytes[at] ^= (byte)(1 << random.Next(8));
                break;
            case 1 when at < bytes.Count:
                bytes[at] = (byte)random.Next(256);
                break;
            case 2:
                bytes.RemoveRange(at, length);
                break;
            case 3:
                bytes.InsertRange(at, bytes.GetRange(at, length));
                break;
            case 4:
                var other = Seed();
                var from = random.Next(other.Length + 1);
                bytes.InsertRange(at, other[from..Math.Min(other.Length, from + (1 << random.Next(10)))]);
                break;
            case 5:
                bytes.RemoveRange(at, bytes.Count - at);
                break;
            case 6:
                var repeated = Hostile();
                bytes.InsertRange(at, Enumerable.Repeat(repeated, 1 << random.Next(14)).SelectMany(word => word).Take(MostBytes).ToArray());
                break;
            case 7:
                Replace(bytes, WordAt(bytes, at), Hostile());
                break;
            default:
                bytes.InsertRange(at, Hostile());
                break;
        }
    }

    private void ChangeSense(List<byte> bytes)
    {
        var at = random.Next(bytes.Count + 1);
        var line = Around(bytes, at, character => character != '\n');
        switch (random.Next(10))
        {
            case 0:
                Replace(bytes, line, []);
                break;
            case 1:
                bytes.InsertRange(line.End, bytes.GetRange(line.Start, line.End - line.Start).Prepend((byte)'\n').ToArray());
                break;
            case 2:
                Replace(bytes, WordAt(bytes, at), Hostile());
                break;
            case 3 or 4 or 5 or 6:
                ChangeDigit(bytes, at);
                break;
            default:
                var other = Seed().ToList();
                var word = WordAt(other, random.Next(other.Count + 1));
                Replace(bytes, WordAt(bytes, at), [.. other.GetRange(word.Start, word.End - word.Start)]);
                break;
        }
    }

    /// <summary>Puts another digit, or a few, where one stands.</summary>
    private void ChangeDigit(List<byte> bytes, int from)
    {
        if (bytes.FindIndex(from, character => char.IsAsciiDigit((char)character)) is var at and >= 0)
        {
            Replace(bytes, (at, at + 1), [.. Enumerable.Range(0, 1 + random.Next(3)).Select(_ => (byte)('0' + random.Next(10)))]);
        }
    }

    private static void Repeat(int times, Action action)
    {
        for (var i = 0; i < times; i++)
        {
            action();
        }
    }

    private byte[] Seed() => seeds[random.Next(seeds.Count)];

    private byte[] Hostile() => HostileWords.All[random.Next(HostileWords.All.Count)];

    private static void Replace(List<byte> bytes, (int Start, int End) part, byte[] replacement)
    {
        bytes.RemoveRange(part.Start, part.End - part.Start);
        bytes.InsertRange(part.Start, replacement);
    }

    /// <summary>The word or number at a place or next after it.</summary>
    private static (int Start, int End) WordAt(List<byte> bytes, int at)
    {
        while (at < bytes.Count && !IsOfWord(bytes[at]))
        {
            at++;
        }

        return Around(bytes, at, IsOfWord);
    }

    private static (int Start, int End) Around(List<byte> bytes, int at, Func<byte, bool> belongs)
    {
        var (start, end) = (at, at);
        while (start > 0 && belongs(bytes[start - 1]))
        {
            start--;
        }

        while (end < bytes.Count && belongs(bytes[end]))
        {
            end++;
        }

        return (start, end);
    }

    private static bool IsOfWord(byte character) => char.IsAsciiLetterOrDigit((char)character) || character is (byte)'.' or (byte)'-' or (byte)'_';
}
