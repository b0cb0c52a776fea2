namespace Auditor.Rules.Tests;

/// <summary>
/// The table of k against its derivation from the heat capacity and resistivity of the metal (IEC 60364-5-54 Annex A):
/// k = √(Qc (β + 20 K)/ρ20 · ln((β + θf)/(β + θi))).
/// </summary>
public class AdiabaticTests
{
    public static IEnumerable<TheoryDataRow<string, string, string, string>> Entries() =>
        from entry in Shipped.Lookup("k-factor").Cells()
        where !entry.Cell.IsEmpty
        let keys = entry.Keys.Cast<string>().ToArray()
        select new TheoryDataRow<string, string, string, string>(keys[0], keys[1], keys[2], keys[3])
        {
            TestDisplayName = "k · " + string.Join(" · ", keys),
        };

    [Theory]
    [MemberData(nameof(Entries))]
    public void A_tabulated_k_follows_from_its_temperatures(string material, string insulation, string role, string size)
    {
        // The tables state k per mm², and round it to a whole number.
        const double PerSquareMillimetre = 1e-6;
        var tabulated = Figure("k-factor", material, insulation, role, size) * PerSquareMillimetre;
        var derived = Prefactor(material) * Math.Sqrt(Math.Log(Warmth("final") / Warmth("initial"))) * PerSquareMillimetre;
        Assert.Equal(derived, tabulated, 1.0);

        double Warmth(string moment) =>
            Figure("adiabatic-beta", material) + Figure("k-temperature", material, insulation, role, size, moment);
    }

    [Theory]
    [InlineData("copper", 226)]
    [InlineData("aluminium", 148)]
    [InlineData("lead", 41)]
    [InlineData("steel", 78)]
    public void The_prefactor_follows_from_the_constants_of_the_metal(string material, double printed)
    {
        Assert.Equal(printed, Prefactor(material) * 1e-6, 0.5);
        Assert.Equal(printed, Figure("adiabatic-k0", material) * 1e-6, 1e-9);
    }

    private static double Prefactor(string material)
    {
        var (heat, beta) = (Figure("adiabatic-heat-capacity", material), Figure("adiabatic-beta", material));
        return Math.Sqrt(heat * (beta + 20) / Figure("adiabatic-resistivity", material));
    }

    private static double Figure(string lookup, params IReadOnlyList<string> keys) => LookupFigure.Of(Shipped.Lookup(lookup), [.. keys]);
}
