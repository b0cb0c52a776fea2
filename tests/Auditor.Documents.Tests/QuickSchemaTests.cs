using Auditor.Testing;

namespace Auditor.Documents.Tests;

/// <summary>The quick look at a document never contradicts the validator.</summary>
public class QuickSchemaTests
{
    private static readonly string[] Values = ["~", "0", "-3", "2.5", "7", "word", "2.5 mm²", "10 A", "-1 m", "true", "2026-02-28", "B", "any"];

    public static TheoryData<string, string> Shipped =>
    [
        ("design", "examples"), ("table", "rules/tables"), ("lookup", "rules/tables"), ("curve", "rules/curves"), ("sheet", "rules/sheets"),
        ("provision", "rules/provisions"), ("set", "rules/sets"), ("adjustment", "rules/adjustments"), ("picture", "rules/pictures"), ("register", "rules/register"),
    ];

    [Fact]
    public void The_shipped_schedule_needs_no_validator()
    {
        var schema = Schema.Parse(new SourceText("schedule", File.ReadAllText(Repository.PathOf("templates/schedule.schema.json"))));
        Assert.Equal(Acceptance.Yes, schema.Look(Yaml.Read(File.ReadAllText(Repository.PathOf("templates/schedule.yaml")))));
    }

    [Theory]
    [InlineData("""{ "minLength": 0 }""", "''", true)]
    [InlineData("""{ "minLength": 1 }""", "''", false)]
    [InlineData("""{ "minLength": 1 }""", "a", true)]
    [InlineData("""{ "minLength": 1 }""", "7", true)]
    [InlineData("""{ "minLength": 1, "type": "string" }""", "7", false)]
    public void A_text_that_has_to_say_something_is_judged_as_by_the_validator(string json, string value, bool isTaken)
    {
        var schema = Schema.Parse(new SourceText("text", json));
        var problems = new Problems();
        schema.Explain(Yaml.Read(value), problems);

        Assert.Equal(isTaken, !problems.HasErrors);
        Assert.Equal(isTaken ? Acceptance.Yes : Acceptance.No, schema.Look(Yaml.Read(value)));
    }

    [Theory]
    [MemberData(nameof(Shipped))]
    public void Shipped_files_are_taken_and_changed_ones_are_judged_as_by_the_validator(string name, string folder)
    {
        var schema = Schema.Parse(new SourceText(name, File.ReadAllText(Repository.PathOf($"rules/schema/{name}.schema.json"))));
        var random = new Random(20261201);
        var (taken, refused) = (0, 0);
        foreach (var root in Roots(folder, name).Take(40))
        {
            Assert.Equal(Acceptance.Yes, schema.Look(root));
            for (var i = 0; i < 8; i++)
            {
                var changed = Changed(root, random);
                var problems = new Problems();
                schema.Explain(changed, problems);
                Assert.NotEqual(problems.HasErrors ? Acceptance.Yes : Acceptance.No, schema.Look(changed));
                (taken, refused) = problems.HasErrors ? (taken, refused + 1) : (taken + 1, refused);
            }
        }

        Assert.InRange(taken, 3, int.MaxValue);
        Assert.InRange(refused, 3, int.MaxValue);
    }

    private static IEnumerable<MappingNode> Roots(string folder, string kind) =>
        Directory.EnumerateFiles(Repository.PathOf(folder), kind == "design" ? "*.design.yaml" : "*.yaml", SearchOption.AllDirectories)
            .Order(StringComparer.Ordinal)
            .Select(file => YamlReader.Read(new SourceText("a.yaml", File.ReadAllText(file)), new Problems()))
            .OfType<MappingNode>()
            .Where(root => !HasInclude(root) && (kind == "design" || root.Entries[0].Key.Value == (kind == "provision" ? "rule" : kind)));

    /// <summary>An <c>include</c> is gone before a document is held against its schema.</summary>
    private static bool HasInclude(Node node) => node switch
    {
        MappingNode mapping => mapping.Entry("include") is not null || mapping.Entries.Any(entry => HasInclude(entry.Value)),
        SequenceNode sequence => sequence.Items.Any(HasInclude),
        _ => false,
    };

    /// <summary>The document with one value, key or item changed somewhere.</summary>
    private static Node Changed(Node node, Random random) => node switch
    {
        MappingNode { Entries.Count: > 0 } mapping => Changed(mapping, random.Next(mapping.Entries.Count), random),
        SequenceNode { Items.Count: > 0 } sequence => Changed(sequence, random.Next(sequence.Items.Count), random),
        _ => random.Next(8) switch
        {
            0 => new MappingNode(node.Span, []),
            1 => new SequenceNode(node.Span, []),
            _ => Yaml.Read(Values[random.Next(Values.Length)]) ?? node,
        },
    };

    private static MappingNode Changed(MappingNode mapping, int at, Random random)
    {
        var entry = mapping.Entries[at];
        MappingEntry[] instead = random.Next(12) switch
        {
            0 => [],
            1 => [new MappingEntry(new Located<string>(entry.Key.Value + "s", entry.Key.Span), entry.Value)],
            _ => [new MappingEntry(entry.Key, Changed(entry.Value, random))],
        };
        return new MappingNode(mapping.Span, [.. mapping.Entries.Take(at), .. instead, .. mapping.Entries.Skip(at + 1)]);
    }

    private static SequenceNode Changed(SequenceNode sequence, int at, Random random) =>
        new(sequence.Span, [.. sequence.Items.Take(at), .. random.Next(6) == 0 ? Array.Empty<Node>() : [Changed(sequence.Items[at], random)], .. sequence.Items.Skip(at + 1)]);
}
