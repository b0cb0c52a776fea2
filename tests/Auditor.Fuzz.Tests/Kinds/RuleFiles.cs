using Auditor.Documents;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>Files of rule data of every kind, read and held against the schema that their first key names.</summary>
internal sealed class RuleFiles : FuzzKind
{
    private static readonly Dictionary<string, string> SchemaOfKind = new()
    {
        ["lookup"] = "lookup",
        ["table"] = "table",
        ["curve"] = "curve",
        ["sheet"] = "sheet",
        ["rule"] = "provision",
        ["adjustment"] = "adjustment",
        ["picture"] = "picture",
        ["set"] = "set",
        ["register"] = "register",
    };

    private readonly Dictionary<string, Schema> _schemas = SchemaOfKind.ToDictionary(kind => kind.Key, kind => Corpus.Home.Schema(kind.Value));

    public override IReadOnlyList<byte[]> Seeds { get; } =
        [.. Corpus.Files("rules", "*.yaml", every: 5).Where(file => SchemaOfKind.ContainsKey(FirstKey(Corpus.Read(file))))];

    public override Judgement Judge(byte[] input)
    {
        var problems = new Problems();
        var root = SourceReader.Read(Folder.Write("fuzzed.yaml", input), "fuzzed.yaml", problems) is { } source ? YamlReader.Read(source, problems) : null;
        if (root is not null)
        {
            (_schemas.GetValueOrDefault(FirstKey(root)) ?? _schemas["rule"]).Validate(root, problems);
        }

        return Judged(root is not null && !problems.HasErrors, problems);
    }

    private static string FirstKey(Node root) => root is MappingNode { Entries: [var first, ..] } ? first.Key.Value : "";
}
