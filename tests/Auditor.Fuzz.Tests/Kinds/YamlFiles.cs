using Auditor.Documents;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>Files of rules and small designs, read as YAML and no more.</summary>
internal sealed class YamlFiles : FuzzKind
{
    private const int Longest = 6_000;

    public override IReadOnlyList<byte[]> Seeds { get; } =
        [.. Corpus.Files("rules", "*.yaml", every: 7).Concat(Corpus.Files("examples", "*.yaml")).Where(file => file.Length <= Longest)];

    public override Judgement Judge(byte[] input)
    {
        var problems = new Problems();
        var root = SourceReader.Read(Folder.Write("fuzzed.yaml", input), "fuzzed.yaml", problems) is { } source ? YamlReader.Read(source, problems) : null;

        // A tree without what was refused in it goes with problems.
        return root is not null && problems.HasErrors ? Judged(hasResult: false, problems) : Judged(root is not null, problems);
    }
}
