using Auditor.Engine.Findings;

namespace Auditor.Engine.Tests;

public class EvaluationTests
{
    [Theory]
    [InlineData("-", "Zs", "0.35 Ω")]
    [InlineData("DB1", "Zdb", "0.35 Ω")]
    [InlineData("DB1/1", "R1R2", "0.2692 Ω")]
    [InlineData("DB1/1", "Zs", "0.6192 Ω")]
    [InlineData("DB1/1", "Ia", "160 A")]
    [InlineData("DB1/1", "Zs_max", "1.366 Ω")]
    [InlineData("DB1/shed", "R1R2", "0.161 Ω")]
    [InlineData("DB2", "Zdb", "0.511 Ω")]
    [InlineData("DB2/1", "Zs", "not known")]
    [InlineData("DB1/1", "longest_leg", "40 m")]
    [InlineData("DB2/1", "sockets", "yes")]
    [InlineData("DB2/2", "sockets", "no")]
    public void Quantities_are_computed_over_the_tree(string key, string symbol, string value)
    {
        // A ring of 40 m of 2.5/1.5 mm² and 20 m of 2.5/2.5 mm²: (40·(7.41+12.1) + 20·2·7.41)/4 mΩ. The figures per metre are those of IEC 60228.
        var subject = Small.Design("house").Find(key)!;
        var slot = subject.Shape.Quantity(symbol)!;

        Assert.Equal(value, ValueText.Show(subject.Quantity(slot.Index), slot.Unit));
    }

    [Fact]
    public void Each_quantity_is_computed_once()
    {
        // Sixty doublings: computed anew each time it is asked for, the last would take 2^60 steps.
        using var rules = new TemporaryRules().With("set.yaml", "set: set\ntitle: Doublings\nuses: { sheets: [sheet.yaml] }\n")
            .WithSheet("sheet.yaml", Enumerable.Range(0, 61).Select(n => n == 0 ? "circuit q0 1 = 1" : $"circuit q{n} 1 = q{n - 1} + q{n - 1}"));
        var design = Small.Design("house", rules.LoadSound("set.yaml"));
        var circuit = design.Find("DB1/1")!;

        Assert.Equal(1152921504606846976.0, circuit.Quantity(60).Number);
    }

    [Fact]
    public void The_order_of_asking_changes_nothing()
    {
        var forward = Values(Small.Design("house"), subjects => subjects);
        var backward = Values(Small.Design("house"), subjects => subjects.Reverse());

        Assert.Equal(forward, backward);
    }

    [Fact]
    public void A_chain_of_quantities_of_any_length_ends()
    {
        using var rules = new TemporaryRules().With("set.yaml", "set: set\ntitle: A long chain\nuses: { sheets: [sheet.yaml] }\n")
            .WithSheet("sheet.yaml", Enumerable.Range(0, 20_001).Select(n => n == 0 ? "circuit q0 1 = 1" : $"circuit q{n} 1 = abs(abs(q{n - 1} + 0))"));
        var circuit = Small.Design("house", rules.LoadSound("set.yaml")).Find("DB1/1")!;

        var value = circuit.Quantity(20_000);
        Assert.Equal("too many quantities rest on one another", Assert.Single(value.Absences.Items).Why);
        Assert.Equal(1, circuit.Quantity(100).Number);
    }

    private static List<string> Values(Installation.Design design, Func<IEnumerable<Installation.DesignSubject>, IEnumerable<Installation.DesignSubject>> order)
    {
        var shown = new Dictionary<string, string>();
        foreach (var subject in order(design.Subjects))
        {
            foreach (var slot in subject.Shape.Quantities)
            {
                shown[$"{subject.Key} {slot.Symbol}"] = ValueText.Show(subject.Quantity(slot.Index), slot.Unit);
            }
        }

        return [.. shown.OrderBy(pair => pair.Key, StringComparer.Ordinal).Select(pair => $"{pair.Key} = {pair.Value}")];
    }
}
