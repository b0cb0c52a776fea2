using Auditor.Documents;
using Auditor.Engine.RuleTests;

namespace Auditor.Rules.Tests;

/// <summary>Runs every case that stands in the sheets and rules of the shipped sets, each as a test of its own.</summary>
public class CaseTests
{
    private static readonly Dictionary<string, (IReadOnlyList<CaseResult> Results, Problems Problems)> Runs =
        new[] { Shipped.Base, Shipped.UnitedKingdom }.ToDictionary(set => set, RunAll);

    public static IEnumerable<TheoryDataRow<string, int>> Cases() =>
        from run in Runs
        from place in Enumerable.Range(0, run.Value.Results.Count)
        let result = run.Value.Results[place]
        select new TheoryDataRow<string, int>(run.Key, place)
        {
            TestDisplayName = $"{run.Key} · {result.Owner} · {result.Name} ({result.Span})",
        };

    [Theory]
    [MemberData(nameof(Cases))]
    public void A_case_comes_out_as_it_says(string set, int place) => Assert.Null(Runs[set].Results[place].Failure);

    [Theory]
    [InlineData(Shipped.Base)]
    [InlineData(Shipped.UnitedKingdom)]
    public void Every_case_can_be_run_as_written(string set) => Assert.Equal("", ProblemText.Render(Runs[set].Problems.All));

    [Theory]
    [InlineData(Shipped.Base)]
    [InlineData(Shipped.UnitedKingdom)]
    public void Every_quantity_has_a_case(string set) =>
        Assert.All(Shipped.Set(set).Quantities, quantity => Assert.NotEmpty(quantity.Node.Mappings("cases")));

    [Theory]
    [InlineData(Shipped.Base)]
    [InlineData(Shipped.UnitedKingdom)]
    public void Every_case_of_a_quantity_names_its_source(string set) =>
        Assert.Empty(
            from quantity in Shipped.Set(set).Quantities
            from node in quantity.Node.Mappings("cases")
            where string.IsNullOrWhiteSpace(node.Text("source"))
            select node.Span.ToString());

    private static (IReadOnlyList<CaseResult>, Problems) RunAll(string set)
    {
        var problems = new Problems();
        return (new CaseRunner(Shipped.Set(set), problems).RunAll(), problems);
    }
}
