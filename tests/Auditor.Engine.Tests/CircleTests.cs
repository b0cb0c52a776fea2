namespace Auditor.Engine.Tests;

/// <summary>Circles among quantities of one rule set, which is read and never evaluated.</summary>
public class CircleTests
{
    [Theory]
    [InlineData("circuit A 1 = A + 1", "circuit A → circuit A")]
    [InlineData("circuit A 1 = B; circuit B 1 = A", "circuit A → circuit B → circuit A")]
    [InlineData("circuit A 1 = B; circuit B 1 = C; circuit C 1 = 1 + A", "circuit A → circuit B → circuit C → circuit A")]
    [InlineData("circuit A 1 = 1; circuit B 1 = choose(true, 1, B)", "circuit B → circuit B")]
    [InlineData("circuit A 1 = B ?? 1; circuit B 1 = choose(given(A), 1, 2)", "circuit A → circuit B → circuit A")]
    [InlineData("board A 1 = sum_of(circuits, B); circuit B 1 = up.A", "circuit B → board A → circuit B")]
    [InlineData("leg r 1 = up.R; circuit R 1 = sum_of(legs, r)", "leg r → circuit R → leg r")]
    [InlineData("circuit A 1 = sum_of(legs, this.A)", "circuit A → circuit A")]
    [InlineData("circuit A 1 = sum_of(legs, up.A)", "circuit A → circuit A")]
    [InlineData("circuit A 1 = fed.up.A; installation A 1 = 1", "circuit A → circuit A")]
    [InlineData("circuit A flag = !A", "circuit A → circuit A")]
    public void Quantities_that_need_one_another_are_refused_with_the_circle_spelled_out(string sheet, string circle) =>
        Assert.Equal([$"formulas-in-a-circle: these quantities need one another: {circle}"], Told(sheet));

    [Fact]
    public void A_circle_through_a_quantity_already_looked_at_is_found() =>
        Assert.Equal(
            ["formulas-in-a-circle: these quantities need one another: circuit A → board B → circuit C → circuit A"],
            Told("circuit A 1 = up.B; board B 1 = sum_of(circuits, C); circuit C 1 = A"));

    [Fact]
    public void A_circle_is_not_hidden_by_a_sound_one_that_shares_its_quantities()
    {
        // Board A asks B above and B beside it, and B asks A: by the first way the circle climbs and ends, by the second it does not.
        Assert.Equal(
            ["formulas-in-a-circle: these quantities need one another: board A → board B → board A"],
            Told("board A 1 = up.up.B + B; board B 1 = A; installation B 1 = 1"));

        // A and B climb; by way of C, A descends first.
        Assert.Equal(
            ["formulas-in-a-circle: these quantities need one another: board B → board A → circuit C → board B"],
            Told("board A 1 = B + sum_of(circuits, C); board B 1 = up.up.A; installation A 1 = 1; circuit C 1 = up.B"));
    }

    [Fact]
    public void Each_separate_circle_is_told() =>
        Assert.Equal(
            [
                "formulas-in-a-circle: these quantities need one another: circuit A → circuit A",
                "formulas-in-a-circle: these quantities need one another: circuit B → circuit C → circuit B",
                "formulas-in-a-circle: these quantities need one another: leg D → leg D",
            ],
            Told("circuit A 1 = A; circuit B 1 = C; circuit C 1 = B; leg D 1 = D; leg E 1 = D + up.A"));

    [Theory]
    [InlineData("board Z 1 = up.Z + 1; circuit Z 1 = up.Z + 1; installation Z 1 = 1")]
    [InlineData("board I 1 = sum_of(circuits, I); circuit I 1 = fed.I ?? 1; installation I 1 = sum_of(boards, I)")]
    [InlineData("board Z 1 = up.Z; circuit Z 1 = up.Z; installation Z 1 = 1; board I 1 = sum_of(circuits, I + Z); circuit I 1 = fed.I ?? Z")]
    [InlineData("circuit A 1 = B + C; circuit B 1 = D; circuit C 1 = D; circuit D 1 = 1")]
    [InlineData("circuit R 1 = sum_of(legs, r * this.k); leg r 1 = up.k; circuit k 1 = 2")]
    public void Chains_that_only_climb_or_only_descend_are_sound(string sheet) => Assert.Empty(Told(sheet));

    [Fact]
    public void A_quantity_with_a_fault_of_its_own_is_told_once_whoever_needs_it() =>
        Assert.StartsWith("unknown-symbol: ", Assert.Single(Told("circuit A 1 = qqqqqqqqqq; circuit B 1 = A; circuit C 1 = B + A")), StringComparison.Ordinal);

    [Fact]
    public void A_circle_of_thousands_is_found_as_well()
    {
        var told = Told(string.Join("; ", Enumerable.Range(0, 5000).Select(n => $"circuit q{n} 1 = q{(n + 1) % 5000}")));

        Assert.StartsWith("formulas-in-a-circle: these quantities need one another: circuit q0 → circuit q1 → circuit q2 → ", Assert.Single(told));
    }

    private static IReadOnlyList<string> Told(string sheet)
    {
        using var rules = new TemporaryRules().With("set.yaml", "set: set\ntitle: Circles\nuses: { sheets: [sheet.yaml] }\n")
            .WithSheet("sheet.yaml", sheet.Split("; "));
        rules.Load("set.yaml", out var problems);
        return [.. problems.All.Select(problem => $"{problem.Code}: {problem.Message}")];
    }
}
