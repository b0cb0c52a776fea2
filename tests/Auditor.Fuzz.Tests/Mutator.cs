using System.Text;

namespace Auditor.Fuzz.Tests;

/// <summary>Makes bad files out of good ones, always the same from the same seed.</summary>
/// <param name="seeds">Good files of one kind.</param>
/// <param name="random">The source of chance.</param>
internal sealed class Mutator(IReadOnlyList<byte[]> seeds, Random random)
{
    private const int MostBytes = 200_000;

    private static readonly byte[][] Words = [.. new[]
    {
        "&a ", "*a", "!!set ", "<<: ", "---\n", "...\n", "%YAML 1.1\n", "? ", ": ", "- ", "[", "]", "{", "}", "\"", "'", "|\n", ">\n", "\t", "\r\n", "\0", "\uFEFF", "\u2028",
        "include: ../../etc/passwd\n", "include: a.yaml\n", "null", "~", "true", "0", "-1", "1e308", "1e309", "0x7fffffffffffffff", ".nan", "NaN", "99999999999999999999",
        " mm²", " kA", " ± 200 %", " ± 1e300 m", ", assumed", "(", ")", "((((((((((((((((", " ^ ", " ** ", " / 0 ", " ?? ", "choose(", "missing", "{{", "}}", "{{ include 'x' }}",
        "{{ while true }}", "{{ end }}", "{{ for i in 1..1000000000 }}", "{{ 'a' * 100000000 }}", ",", ";", "\",\"", "\"\"", "\\u0000", "\\uD800", "id: 1\n", "feeds: A\n",
    }.Select(Encoding.UTF8.GetBytes)];

    /// <summary>The next bad file.</summary>
    public byte[] Next()
    {
        var bytes = seeds[random.Next(seeds.Count)].ToList();
        for (var changes = 1 + random.Next(4); changes > 0; changes--)
        {
            Change(bytes);
        }

        return bytes.Count > MostBytes ? [.. bytes.Take(MostBytes)] : [.. bytes];
    }

    private void Change(List<byte> bytes)
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
                var other = seeds[random.Next(seeds.Count)];
                var from = random.Next(other.Length + 1);
                bytes.InsertRange(at, other.AsSpan(from, Math.Min(other.Length - from, 1 << random.Next(10))).ToArray());
                break;
            case 5:
                bytes.RemoveRange(at, bytes.Count - at);
                break;
            case 6:
                var repeated = Words[random.Next(Words.Length)];
                bytes.InsertRange(at, Enumerable.Repeat(repeated, 1 << random.Next(14)).SelectMany(word => word).Take(MostBytes));
                break;
            case 7:
                ChangeWord(bytes);
                break;
            default:
                bytes.InsertRange(at, Words[random.Next(Words.Length)]);
                break;
        }
    }

    /// <summary>Puts something else where a word or number stands, so that the file keeps its shape.</summary>
    private void ChangeWord(List<byte> bytes)
    {
        var start = random.Next(bytes.Count + 1);
        while (start > 0 && start < bytes.Count && IsOfWord(bytes[start - 1]))
        {
            start--;
        }

        var end = start;
        while (end < bytes.Count && IsOfWord(bytes[end]))
        {
            end++;
        }

        bytes.RemoveRange(start, end - start);
        bytes.InsertRange(start, Words[random.Next(Words.Length)]);
    }

    private static bool IsOfWord(byte character) => char.IsAsciiLetterOrDigit((char)character) || character is (byte)'.' or (byte)'-' or (byte)'_';
}
