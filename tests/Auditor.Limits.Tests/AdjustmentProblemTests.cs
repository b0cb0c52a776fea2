using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Limits.Tests;

/// <summary>Adjustments and uncertainties with a fault: each is refused where it stands.</summary>
public class AdjustmentProblemTests
{
    [Theory]
    [InlineData("unknown-input", "of: leg\ninput: lenght\nrange: { from: 1 m, to: 2 m }")]
    [InlineData("not-adjustable", "of: circuit\ninput: serves\nsteps: [a, b]")]
    [InlineData("empty-range", "of: leg\ninput: length\nrange: { from: 2 m, to: 1 m }")]
    [InlineData("wrong-type", "of: leg\ninput: length\nrange: { from: 1 A, to: 2 m }")]
    [InlineData("unknown-table", "of: leg\ninput: csa\nseries: { lookup: preferred-size }")]
    [InlineData("not-a-series", "of: circuit\ninput: device.rating\nseries: { lookup: preferred-rating }")]
    [InlineData("not-a-series", "of: circuit\ninput: device.rating\nseries: { lookup: preferred-csa }")]
    [InlineData("unknown-word", "of: circuit\ninput: device.curve\nsteps: [B, Q]")]
    [InlineData("wrong-result", "of: circuit\ninput: readings.zs\nrange: { from: 1 ohm, to: 2 ohm }\nexpect: Ib")]
    [InlineData("unknown-symbol", "of: leg\ninput: csa\nseries: { lookup: preferred-csa }\nalso: { cpc: cpc_size }")]
    [InlineData("unknown-symbol", "of: leg\ninput: csa\nseries: { lookup: preferred-csa }\nexists: is_made")]
    public void An_adjustment_with_a_fault_is_refused_where_it_stands(string code, string text)
    {
        using var rules = new HouseRules();
        rules.Write("adjustments/x.yaml", "adjustment: x\nlabel: x\nabout: x\n" + text + "\n");

        var problem = Assert.Single(rules.Load("uses: { adjustments: [adjustments] }").Problems);
        Assert.Equal(code, problem.Code);
        Assert.EndsWith("adjustments/x.yaml", problem.Span!.Value.Source.Path, StringComparison.Ordinal);
    }

    [Fact]
    public void A_set_has_an_adjustment_once()
    {
        using var rules = new HouseRules();
        rules.Write("adjustments/a.yaml", Length("a", "1 m"));
        rules.Write("adjustments/b.yaml", Length("a", "2 m"));

        Assert.Equal("duplicate-adjustment", Assert.Single(rules.Load("uses: { adjustments: [adjustments] }").Problems).Code);
    }

    [Fact]
    public void A_house_set_replaces_an_adjustment_of_the_same_name()
    {
        using var rules = new HouseRules();
        rules.Write("adjustments/cable-length.yaml", Length("cable-length", "3 m"));
        var (set, problems) = rules.Load("uses: { adjustments: [adjustments] }");

        Assert.Empty(problems);
        var ladder = (Engine.Adjustments.RangeLadder)set!.Adjustments.Single(adjustment => adjustment.Id == "cable-length").Ladder;
        Assert.Equal((3.0, 90.0), (ladder.From, ladder.To));
    }

    [Theory]
    [InlineData("unknown-input", "readings.zx", "Ω", "0.1 ohm")]
    [InlineData("unit-mismatch", "readings.zs", "A", "0.1 A")]
    [InlineData("duplicate-uncertainty", "readings.zs", "Ω", "0.1 ohm")]
    public void An_uncertainty_with_a_fault_is_refused_where_it_stands(string code, string reading, string unit, string formula)
    {
        using var rules = new HouseRules();
        rules.Write("sheets/x.yaml", $$"""
            sheet: house
            about: x
            quantities:
              - symbol: u_house
                name: x
                of: circuit
                unit: {{unit}}
                formula: {{formula}}
                uncertainty-of: {{reading}}
                clause: { type: verification }
                cases: [{ name: x, given: {}, expect: {{formula}} }]

            """);

        Assert.Equal(code, Assert.Single(rules.Load("uses: { sheets: [sheets] }").Problems).Code);
    }

    private static string Length(string id, string from) =>
        $"adjustment: {id}\nlabel: x\nabout: x\nof: leg\ninput: length\nrange: {{ from: {from}, to: 90 m }}\n";

    /// <summary>A house set in a folder of its own.</summary>
    private sealed class HouseRules : IDisposable
    {
        private readonly string _folder = Directory.CreateTempSubdirectory("auditor-").FullName;

        public void Write(string path, string text)
        {
            var full = Path.Combine(_folder, path);
            Directory.CreateDirectory(Path.GetDirectoryName(full)!);
            File.WriteAllText(full, text);
        }

        public (RuleSet? Set, IReadOnlyList<Problem> Problems) Load(string uses)
        {
            Write("house.yaml", $"set: house\ntitle: House\nextends: united-kingdom\n{uses}\n");
            var problems = new Problems();
            return (RuleSetLoader.Load(Shipped.Home, Path.Combine(_folder, "house.yaml"), Repository.Root, null, problems), problems.All);
        }

        public void Dispose() => Directory.Delete(_folder, recursive: true);
    }
}
