using Auditor.Documents;
using Auditor.Engine.RuleTests;
using Auditor.Testing;

namespace Auditor.Rules.Tests;

/// <summary>A worked example of a publication.</summary>
/// <param name="Id">Its number and name.</param>
/// <param name="Root">Its file.</param>
internal sealed record PublishedExample(string Id, MappingNode Root)
{
    public const string Folder = "tests/published";

    private static readonly Lazy<IReadOnlyDictionary<string, PublishedExample>> Files = new(ReadAll);

    /// <summary>All that run, by id.</summary>
    public static IReadOnlyDictionary<string, PublishedExample> All => Files.Value;

    public IEnumerable<MappingNode> Cases => Root.Mappings("cases");

    public bool HasSourceError => Root.Find("source-error") is not null;

    /// <summary>Runs one of its cases.</summary>
    public CaseResult Run(MappingNode node)
    {
        var problems = new Problems();
        var result = Run(node, problems);
        return problems.All.Count == 0 ? result : result with { Failure = ProblemText.Render(problems.All) };
    }

    /// <summary>The case with the print of the source in place of what is expected.</summary>
    public static MappingNode AsPrinted(MappingNode node) =>
        new(node.Span, [.. node.Entries.Where(entry => entry.Key.Value is not ("expect" or "printed")),
            new MappingEntry(new Located<string>("expect", node.Entry("printed")!.Key.Span), node.Find("printed")!)]);

    /// <summary>The root mapping of a data file beside the examples.</summary>
    public static MappingNode Read(string file)
    {
        var problems = new Problems();
        var source = SourceReader.Read(Repository.PathOf($"{Folder}/{file}"), $"{Folder}/{file}", problems);
        var root = source is null ? null : YamlReader.Read(source, problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return Assert.IsType<MappingNode>(root);
    }

    private CaseResult Run(MappingNode node, Problems problems)
    {
        var set = Shipped.Set(Root.Text("set")!);
        var runner = new CaseRunner(set, problems);
        return node.Text("rule") is { } id
            ? runner.Run(set.Rules.Single(rule => rule.Id == id), node)
            : runner.Run(Shipped.Quantity(set.Title.Id, node.Text("of")!, node.Text("quantity")!), node);
    }

    private static Dictionary<string, PublishedExample> ReadAll() =>
        Directory.EnumerateFiles(Repository.PathOf(Folder), "???-*.yaml").Select(file => Path.GetFileName(file))
            .Order(StringComparer.Ordinal).Select(file => new PublishedExample(Path.GetFileNameWithoutExtension(file), Read(file)))
            .ToDictionary(example => example.Id);
}
