using Auditor.Documents;
using Auditor.Testing;

namespace Auditor.Rules.Tests;

/// <summary>Worked examples of publications, entered as data and run through the shipped sheets and rules.</summary>
public class PublishedTests
{
    public static IEnumerable<TheoryDataRow<string>> Examples() =>
        PublishedExample.All.Keys.Select(id => new TheoryDataRow<string>(id) { TestDisplayName = $"published · {id}" });

    public static IEnumerable<TheoryDataRow<string, int>> WrongPrints() =>
        from example in PublishedExample.All.Values
        from pair in example.Cases.Select((node, place) => (node, place))
        where pair.node.Find("printed") is not null
        select new TheoryDataRow<string, int>(example.Id, pair.place)
        {
            TestDisplayName = $"wrong print · {example.Id} · {pair.node.Text("name")}",
        };

    [Theory]
    [MemberData(nameof(Examples))]
    public void The_sheets_give_what_the_publication_gives(string id)
    {
        var example = PublishedExample.All[id];
        var failures = example.Cases.Select(example.Run).Where(result => result.Failure is not null);
        Assert.Empty(failures.Select(result => $"{result.Name}: {result.Failure}"));
    }

    [Theory]
    [MemberData(nameof(WrongPrints))]
    public void The_sheets_do_not_give_a_wrong_print(string id, int place)
    {
        var example = PublishedExample.All[id];
        var failure = example.Run(PublishedExample.AsPrinted(example.Cases.ElementAt(place))).Failure;
        Assert.StartsWith("expected ", failure, StringComparison.Ordinal);
        Assert.DoesNotContain("missing", failure, StringComparison.Ordinal);
    }

    [Fact]
    public void An_example_states_a_wrong_print_just_where_its_source_is_in_error() =>
        Assert.All(
            PublishedExample.All.Values,
            example => Assert.Equal(example.HasSourceError, example.Cases.Any(node => node.Find("printed") is not null)));

    [Fact]
    public void Every_example_keeps_the_schema_and_stands_in_a_file_of_its_name()
    {
        var path = $"{PublishedExample.Folder}/published.schema.json";
        var schema = Schema.Parse(new SourceText(path, File.ReadAllText(Repository.PathOf(path))));
        var problems = new Problems();
        foreach (var example in PublishedExample.All.Values)
        {
            schema.Validate(example.Root, problems);
            Assert.Equal(example.Id, example.Root.Text("example"));
        }

        Assert.Equal("", ProblemText.Render(problems.All));
    }

    [Fact]
    public void Every_gathered_example_runs_or_is_left_out_for_a_reason()
    {
        var gathered = PublishedExample.Read("examples.yaml").Texts("examples");
        var leftOut = PublishedExample.Read("left-out.yaml").Mappings("left-out").ToArray();
        Assert.Equal(78, gathered.Count);
        Assert.All(leftOut, entry => Assert.NotEqual("", entry.Text("reason") ?? ""));
        Assert.Equal(gathered.Order(StringComparer.Ordinal),
            PublishedExample.All.Keys.Concat(leftOut.Select(entry => entry.Text("example")!)).Order(StringComparer.Ordinal));
    }

    [Fact]
    public void A_tolerance_wider_than_a_tenth_has_its_reason()
    {
        var wide = PublishedExample.All.Values.SelectMany(example => example.Cases)
            .Where(node => node.Text("expect") is { } text && IsWide(text) && node.Find("tolerance-because") is null);
        Assert.Empty(wide.Select(node => node.Span.ToString()));
    }

    private static bool IsWide(string text) =>
        Quantities.QuantityText.TryParse(text, out var stated, out _) && stated.Tolerance is { } tolerance
        && tolerance.Above > 0.1 * Math.Abs(stated.Quantity.Value);
}
