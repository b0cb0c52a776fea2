using Auditor.Documents;
using Auditor.Testing;

namespace Auditor.Rules.Tests;

/// <summary>What every table and curve file must say of itself.</summary>
public class TableStructureTests
{
    public static IEnumerable<TheoryDataRow<string>> Files() =>
        Directory.EnumerateFiles(Repository.PathOf("rules/tables"), "*.yaml", SearchOption.AllDirectories)
            .Concat(Directory.EnumerateFiles(Repository.PathOf("rules/curves"), "*.yaml"))
            .Select(file => Path.GetRelativePath(Repository.Root, file)).Order(StringComparer.Ordinal)
            .Where(file => Path.GetFileName(file) != "lookup.yaml")
            .Select(file => new TheoryDataRow<string>(file) { TestDisplayName = "source and trust · " + file });

    [Theory]
    [MemberData(nameof(Files))]
    public void A_table_names_its_sources_and_how_far_it_may_be_trusted(string file)
    {
        var root = Read(file);
        Assert.NotEmpty(root.Texts("source"));
        Assert.All(root.Texts("source"), source => Assert.False(string.IsNullOrWhiteSpace(source)));
        Assert.NotNull(Formulas.Tables.TrustWords.Find(root.Text("trust") ?? ""));
    }

    [Fact]
    public void No_table_trusts_two_sources_that_it_does_not_name()
    {
        var tables = Files().Select(row => Read(row.Data)).Where(root => root.Text("trust") == "two sources");
        Assert.All(tables, root => Assert.InRange(root.Texts("source").Count, 2, int.MaxValue));
    }

    [Fact]
    public void Every_lookup_says_what_to_give_instead_of_a_missing_figure() =>
        Assert.All(ShippedRule.Set.World.Lookups.Values, lookup => Assert.False(string.IsNullOrWhiteSpace(lookup.WhenMissing), lookup.Name));

    private static MappingNode Read(string file)
    {
        var problems = new Problems();
        var root = YamlReader.Read(SourceReader.Read(Repository.PathOf(file), file, problems)!, problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return Assert.IsType<MappingNode>(root);
    }
}
