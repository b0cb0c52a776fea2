namespace Auditor.Rules.Tests;

/// <summary>Figures that every electrician knows, each computed by the shipped United Kingdom set. Common practice, no source.</summary>
public class TradeFactTests
{
    [Theory]
    [InlineData("2.5 mm²", "1.5 mm²", 19.51)]
    [InlineData("4 mm²", "2.5 mm²", 12.02)]
    [InlineData("1.5 mm²", "1 mm²", 30.2)]
    public void A_kilometre_of_flat_twin_and_earth_has_the_R1R2_of_the_trade(string csa, string cpc, double milliohmPerMetre)
    {
        var ohm = Circuit("R1R2", $"legs: [{{ construction: flat twin and earth, csa: {csa}, cpc: {cpc}, length: 1 km }}]");
        Assert.Equal(milliohmPerMetre, ohm, 0.005);
    }

    [Fact]
    public void Flat_twin_and_earth_of_2_5_drops_18_millivolts_per_ampere_and_metre()
    {
        var given = "{ construction: flat twin and earth, insulation: thermoplastic 70, csa: 2.5 mm², up.n_phases: 1 }";
        Assert.Equal(0.018, Shipped.Compute(Shipped.UnitedKingdom, "leg", "z_vd", given), 1e-9);
    }

    [Theory]
    [InlineData("B", 6, 7.28)]
    [InlineData("C", 16, 1.37)]
    public void A_circuit_breaker_has_the_Zs_limit_of_the_tables(string curve, int rating, double ohm)
    {
        var given = $"{Device(curve, rating)}\n{TnFinalCircuit}";
        Assert.Equal(ohm, Circuit("Zs_max", given), 0.005);
    }

    [Fact]
    public void A_cold_reading_may_reach_eight_tenths_of_the_limit()
    {
        var given = $"{Device("B", 6)}\n{TnFinalCircuit}";
        Assert.Equal(0.8, Circuit("Zs_cold_max", given) / Circuit("Zs_max", given), 1e-9);
    }

    [Theory]
    [InlineData("lighting", 0.03)]
    [InlineData("socket-outlets", 0.05)]
    public void Lighting_may_lose_three_percent_and_the_rest_five(string use, double share)
    {
        var given = $"origin.basis.supply_ownership: public\nserves: [{use}]\nlegs: [{{ length: 30 m }}]";
        Assert.Equal(share, Circuit("vd_limit", given), 1e-9);
    }

    [Theory]
    [InlineData(2.0, "conforms")]
    [InlineData(1.98, "nonconforming")]
    public void An_installation_below_two_megohms_is_looked_into(double megohm, string verdict) =>
        Assert.Equal(verdict, RuleVerdict.Of("insulation-whole-advice",
            $$"""
            basis.stage: verification
            all_circuits:
              - readings.insulation.live_to_live: {{megohm}} Mohm
                readings.insulation.live_to_earth: {{megohm}} Mohm
            """));

    private const string TnFinalCircuit =
        """
        origin.supply.earthing: TN-C-S
        origin.supply.phases: 1
        origin.supply.voltage: 230 V
        feeds_board: false
        """;

    private static string Device(string curve, int rating) =>
        $"device.standard: EN 60898\ndevice.curve: {curve}\ndevice.rating: {rating} A";

    private static double Circuit(string symbol, string given) => Shipped.Compute(Shipped.UnitedKingdom, "circuit", symbol, given);
}
