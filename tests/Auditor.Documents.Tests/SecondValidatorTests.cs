using System.Text.Json.Nodes;
using CsCheck;
using Json.Schema;

namespace Auditor.Documents.Tests;

/// <summary>
/// Verdicts of the schema stage against those of JsonSchema.Net, an independent validator. Quantities are ours alone, so both hold
/// the documents to the schema of the tests without its quantity keywords.
/// </summary>
public class SecondValidatorTests
{
    private static readonly string[] OurKeywords = ["quantity", "signed", "may-be-zero", "at-least", "at-most", "patternErrorMessage"];

    private static readonly string PureSchema = WithoutOurKeywords(JsonNode.Parse(Plan.SchemaText))!.ToJsonString();

    private static readonly Schema Ours = Schema.Parse(new SourceText("pure.schema.json", PureSchema));

    private static readonly JsonSchema Theirs = JsonSchema.FromText(PureSchema);

    private static readonly string[] RunKeys =
    [
        "id", "length", "grouping", "cores", "weight", "buried", "spare", "ambient", "diversity", "serves", "cable", "legs", "device", "other",
    ];

    private static readonly string[] Values =
    [
        "", "~", "a", "'a b'", "12", "'12'", "0", "1.0", "2.5", "62", "61", "-1", "1e300", "5000", "true", "false", "'true'", "later", "2", "single", "sockets",
        "[]", "[sockets]", "[sockets, sockets]", "[sockets, lighting]", "[12]", "{}", "{ csa: a }", "{ csa: a, resistance: b }", "{ csa: 1 }", "[{ csa: a }]",
        "[{ csa: a, resistance: b }]", "{ kind: fuse, rating: a }", "{ kind: fuse }", "{ kind: breaker, curve: B }", "{ kind: breaker, curve: X }", "{ kind: other }",
    ];

    private static readonly string[] TopLines =
    [
        "plan-format: 2", "plan-format: 1.0", "title: ab", "title: abc", "title: 12", "drawn: 2026-02-30", "drawn: 2026-02-28", "drawn: today", "revision: B7",
        "revision: b", "sheet: '007'", "sheet: 007", "notes: {}", "notes: { a: b }", "notes: { a: 1 }", "notes: { a: b, c: d, e: f, g: h }", "house: { x-a: true }",
        "house: { x-a: 1 }", "house: { y: true }", "origin: {}", "origin: { loop-impedance: a }", "origin: { loop-impedance: { resistance: a } }",
        "origin: { transformer: a }", "origin: { transformer: a, loop-impedance: { resistance: a, reactance: b } }", "origin: [a]", "other: 1", "runs: []", "runs: a",
    ];

    private static readonly Gen<string> Runs = Gen.Select(Gen.OneOf(RunKeys), Gen.OneOf(Values), (key, value) => (key, value)).Array[0, 2]
        .Select(pairs => "{ " + string.Join(", ", pairs.Append(("id", "a")).Append(("length", "1 m")).DistinctBy(pair => pair.Item1)
            .Select(pair => $"{pair.Item1}: {pair.Item2}")) + " }");

    private static readonly Gen<string> Documents = Gen.Select(Gen.OneOf(TopLines).Array[0, 2], Runs.Array[1, 2], (lines, runs) => string.Join('\n',
        lines.Append("plan-format: 1").Append($"runs: [{string.Join(", ", runs)}]").DistinctBy(line => line[..line.IndexOf(':', StringComparison.Ordinal)])));

    public static TheoryData<string, string> Files => [.. FilesIn("Bad"), .. FilesIn("Good")];

    [Theory]
    [MemberData(nameof(Files))]
    public void A_whole_file_is_judged_alike(string folder, string name)
    {
        if (Whole(folder, name) is { } root)
        {
            Assert.Equal(IsValidByTheirs(root), IsValidByOurs(root));
        }
    }

    [Fact]
    public void Whole_files_of_both_verdicts_are_compared()
    {
        var roots = Files.Select(file => Whole(file.Data.Item1, file.Data.Item2)).OfType<Node>().ToList();

        Assert.InRange(roots.Count(IsValidByTheirs), 10, 100);
        Assert.InRange(roots.Count(root => !IsValidByTheirs(root)), 15, 100);
    }

    [Fact]
    public void Any_document_is_judged_alike()
    {
        var valid = 0;
        Documents.Sample(
            text =>
            {
                var root = Yaml.Read(text);
                var isValid = IsValidByTheirs(root);
                Assert.Equal(isValid, IsValidByOurs(root));
                Assert.NotEqual(isValid ? Acceptance.No : Acceptance.Yes, Ours.Look(root));
                Interlocked.Add(ref valid, isValid ? 1 : 0);
            },
            iter: 5_000,
            threads: 1); // the other validator keeps state in the schema
        Assert.InRange(valid, 250, 4_750);
    }

    private static IEnumerable<TheoryDataRow<string, string>> FilesIn(string folder)
        => Plan.CasesIn(folder).Select(name => new TheoryDataRow<string, string>(folder, name));

    /// <summary>The tree of a file that was read without loss; null for any other, where there is nothing to judge.</summary>
    private static Node? Whole(string folder, string name)
        => Plan.Load(folder, name, new Problems()) is { Root: var root } && !root.AndAllBelow().Any(node => node.IsPartial) ? root : null;

    private static bool IsValidByOurs(Node root)
    {
        var problems = new Problems();
        Ours.Explain(root, problems);
        return !problems.HasErrors;
    }

    private static bool IsValidByTheirs(Node root)
        => Theirs.Evaluate(ToJson(root), new EvaluationOptions { EvaluateAs = SpecVersion.Draft7, RequireFormatValidation = true }).IsValid;

    /// <summary>The tree as JSON. Numbers are cut to what fits a decimal, in which the other validator counts; no limit lies beyond.</summary>
    private static JsonNode? ToJson(Node node) => node switch
    {
        MappingNode mapping => new JsonObject(mapping.Entries.Select(entry => KeyValuePair.Create(entry.Key.Value, ToJson(entry.Value)))),
        SequenceNode sequence => new JsonArray([.. sequence.Items.Select(ToJson)]),
        ScalarNode { Kind: ScalarKind.Number } scalar => JsonValue.Create(Math.Clamp(scalar.Number, -1e25, 1e25)),
        ScalarNode { Kind: ScalarKind.Flag } scalar => JsonValue.Create(scalar.Flag),
        ScalarNode { Kind: ScalarKind.Text } scalar => JsonValue.Create(scalar.Text),
        _ => null,
    };

    private static JsonNode? WithoutOurKeywords(JsonNode? node) => node switch
    {
        JsonObject keywords => new JsonObject(keywords.Where(pair => !OurKeywords.Contains(pair.Key))
            .Select(pair => KeyValuePair.Create(pair.Key, WithoutOurKeywords(pair.Value)))),
        JsonArray items => new JsonArray([.. items.Select(WithoutOurKeywords)]),
        _ => node?.DeepClone(),
    };
}
