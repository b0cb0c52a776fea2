using System.Security.Cryptography;
using System.Text;
using Auditor.Documents;

namespace Auditor.Engine.RuleSets;

/// <summary>
/// The trees of rule files as bytes in one file beside the shipped rule data, so that nothing has to be read as YAML and held against
/// schemas again. A tree is found by the SHA-256 of its file: a file that was edited is not found and is read in full. The whole is
/// passed over when it is not whole, or was made by another build or with other schemas.
/// </summary>
public sealed class PreparedRules
{
    private const int HashLength = 32;
    private const int EntryLength = HashLength + sizeof(int) + sizeof(int);

    private readonly byte[] _bytes;
    private readonly Dictionary<string, (int Start, int Length)> _places;

    private PreparedRules(byte[] bytes, Dictionary<string, (int Start, int Length)> places)
    {
        _bytes = bytes;
        _places = places;
    }

    /// <summary>Full path of the file for a home of rule data.</summary>
    public static string PathOf(RuleHome home) => Path.Combine(home.Folder, "prepared.bin");

    /// <summary>Reads what was prepared for a home; nothing when there is none that can be used.</summary>
    public static PreparedRules Open(RuleHome home)
    {
        var path = PathOf(home);
        var bytes = File.Exists(path) ? File.ReadAllBytes(path) : [];
        return bytes.Length > 2 * HashLength
            && SHA256.HashData(bytes.AsSpan(HashLength)).AsSpan().SequenceEqual(bytes.AsSpan(0, HashLength))
            && bytes.AsSpan(HashLength, HashLength).SequenceEqual(Maker(home))
            ? new PreparedRules(bytes, Places(bytes))
            : new PreparedRules([], []);
    }

    /// <summary>Prepares all rule files of a home that are without problems, and writes them whole or not at all.</summary>
    /// <returns>How many files were prepared.</returns>
    public static int Write(RuleHome home)
    {
        var kinds = RuleFileReader.OfSets.Concat(RuleFileReader.OfRegister).ToDictionary();
        var reader = new RuleFileReader(home, new Problems(), new PreparedRules([], []), kinds);
        var paths = Directory.EnumerateFiles(home.Folder, "*.yaml", SearchOption.AllDirectories).Order(StringComparer.Ordinal)
            .Select(path => (path, Path.GetRelativePath(home.Folder, path))).ToList();
        var files = reader.Read(paths).DistinctBy(file => file.Sha256, StringComparer.Ordinal).OrderBy(file => file.Sha256, StringComparer.Ordinal).ToList();
        var whole = Whole(files, Maker(home));
        var beside = PathOf(home) + ".new";
        File.WriteAllBytes(beside, [.. SHA256.HashData(whole), .. whole]);
        File.Move(beside, PathOf(home), overwrite: true);
        return files.Count;
    }

    /// <summary>Makes the tree of a file, without problems and held against its schema; null for a file that was not prepared.</summary>
    public Node? Find(SourceFile source) => _places.TryGetValue(source.Sha256, out var place)
        ? new NodeReader(source.Text, _bytes.AsMemory(place.Start, place.Length)).Read()
        : null;

    private static byte[] Whole(List<RuleFile> files, byte[] maker)
    {
        using var trees = new MemoryStream();
        using var head = new MemoryStream();
        using var output = new BinaryWriter(head);
        output.Write(maker);
        output.Write(files.Count);
        foreach (var file in files)
        {
            var start = (int)trees.Length;
            using (var writer = new BinaryWriter(trees, Encoding.UTF8, leaveOpen: true))
            {
                new NodeWriter(writer).Write(file.Root);
            }

            output.Write(Convert.FromHexString(file.Sha256));
            output.Write(start);
            output.Write((int)trees.Length - start);
        }

        output.Flush();
        return [.. head.ToArray(), .. trees.ToArray()];
    }

    private static Dictionary<string, (int Start, int Length)> Places(byte[] bytes)
    {
        var count = BitConverter.ToInt32(bytes, 2 * HashLength);
        var entries = (2 * HashLength) + sizeof(int);
        var trees = entries + (count * EntryLength);
        var places = new Dictionary<string, (int Start, int Length)>(count, StringComparer.Ordinal);
        for (var at = entries; at < trees; at += EntryLength)
        {
            var start = trees + BitConverter.ToInt32(bytes, at + HashLength);
            places.Add(Convert.ToHexStringLower(bytes.AsSpan(at, HashLength)), (start, BitConverter.ToInt32(bytes, at + HashLength + sizeof(int))));
        }

        return places;
    }

    /// <summary>What the trees depend on besides their texts: the schemas, and the code that reads and checks.</summary>
    private static byte[] Maker(RuleHome home)
    {
        using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        hash.AppendData(typeof(Node).Module.ModuleVersionId.ToByteArray());
        hash.AppendData(typeof(PreparedRules).Module.ModuleVersionId.ToByteArray());
        foreach (var path in Directory.EnumerateFiles(Path.Combine(home.Folder, "schema")).Order(StringComparer.Ordinal))
        {
            hash.AppendData(File.ReadAllBytes(path));
        }

        return hash.GetHashAndReset();
    }
}
