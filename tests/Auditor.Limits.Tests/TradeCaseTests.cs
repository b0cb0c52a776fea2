using Auditor.Engine.Adjustments;
using Auditor.Engine.Limits;
using Auditor.Engine.RuleSets;

namespace Auditor.Limits.Tests;

/// <summary>Limits against worked examples of publications and facts of the trade.</summary>
public class TradeCaseTests
{
    [Fact]
    public void The_longest_lighting_circuit_on_a_5_A_rewirable_fuse_is_the_published_one()
    {
        // Published example 017: ElectriciansForums.net thread 5646, 185 m, worked in whole metres and rounded down.
        var plan = Plans.Single(0.45, new()
        {
            ["device.standard"] = "BS 3036",
            ["device.rating"] = "5 A",
            ["serves"] = "[lighting]",
            ["load.current"] = "4 A",
            ["load.power-factor"] = "1",
            ["leg.construction"] = "flat twin and earth",
            ["leg.insulation"] = "thermoplastic 70",
            ["leg.csa"] = "1 mm²",
            ["leg.cpc"] = "1 mm²",
            ["leg.length"] = "20 m",
            ["leg.method"] = "C",
        });
        var limit = Find(plan, Shipped.House("cold-length"), "B/1", "cable-length");

        Assert.Equal(185, Most(limit, "cold-loop-predicted"), 1.5);
    }

    [Fact]
    public void The_highest_loop_impedance_at_the_board_is_that_of_the_exam_question()
    {
        // Published example 009: IET EngX thread 23996, tabulated 1.65 ohm (132.4 A at Cmin 0.95), R1+R2 1.13 ohm: 0.20 ohm, one contributor 0.19 ohm.
        var plan = Plans.Single(0.1, new()
        {
            ["device.standard"] = "EN 60947-2",
            ["device.rating"] = "16 A",
            ["device.magnetic-setting"] = "110.35 A",
            ["serves"] = "[fixed-equipment]",
            ["readings.r1r2"] = "1.13 ohm",
            ["leg.construction"] = "flat twin and earth",
            ["leg.insulation"] = "thermoplastic 70",
            ["leg.csa"] = "2.5 mm²",
            ["leg.length"] = "20 m",
            ["leg.method"] = "C",
        });
        var limit = Find(plan, Shipped.UnitedKingdom, "B", "reading-loop-board");

        Assert.Equal(0.20, Most(limit, "loop-by-continuity"), 0.011);
    }

    [Theory]
    [InlineData("10 A", 1.5, 123)]
    [InlineData("16 A", 1.5, 77)]
    [InlineData("20 A", 2.5, 102)]
    [InlineData("32 A", 2.5, 64)]
    [InlineData("32 A", 4, 102)]
    [InlineData("63 A", 10, 130)]
    [InlineData("100 A", 25, 204)]
    public void The_longest_circuits_on_type_B_breakers_are_those_of_the_catalogue(string rating, double size, double metres)
    {
        // Published example 019: Schneider Electric, maximum cable length; 0.0225 ohm·mm²/m, whole metres, nothing upstream.
        var perMetre = $"{22.5 / size:0.000000} mohm/m";
        var plan = Plans.Single(0.000001, new()
        {
            ["device.standard"] = "EN 60898",
            ["device.curve"] = "B",
            ["device.rating"] = rating,
            ["serves"] = "[fixed-equipment]",
            ["leg.construction"] = "multicore",
            ["leg.insulation"] = "thermoplastic 70",
            ["leg.csa"] = $"{size} mm²",
            ["leg.cpc"] = $"{size} mm²",
            ["leg.resistance-per-metre"] = perMetre,
            ["leg.cpc-resistance-per-metre"] = perMetre,
            ["leg.reactance-per-metre"] = "0.000001 mohm/m",
            ["leg.length"] = "20 m",
            ["leg.method"] = "C",
        });
        var limit = Find(plan, Shipped.House("conventional"), "B/1", "cable-length");

        Assert.Equal(metres, Most(limit, "disconnection-tn"), 1.0);
    }

    [Fact]
    public void The_length_for_five_per_cent_of_voltage_drop_is_that_of_18_millivolts()
    {
        // Common practice: 18 mV/A/m for 2.5 mm² copper; 11.5 V at 20 A are 31.94 m.
        var limit = Find(Radial("20 A"), Shipped.UnitedKingdom, "B/1", "cable-length");

        Assert.Equal(31.94, Most(limit, "voltage-drop-other"), 0.01);
    }

    [Theory]
    [InlineData("10 °C", 0.96 / 1.20)]
    [InlineData("0 °C", 0.92 / 1.20)]
    [InlineData("20 °C", 0.8)]
    public void A_loop_of_the_circuit_alone_may_read_the_share_of_its_limit_that_the_temperature_leaves(string temperature, double share)
    {
        // Common practice: conductors are 1.20 times as great at 70 °C as at 20 °C, 0.96 times at 10 °C, 0.92 times at 0 °C; at no time more
        // than 0.8 of the limit, which is printed as 2.185 ohm for a 20 A type B breaker.
        var plan = Radial("12 A").With("-", "basis.test-temperature", temperature).With("-", "supply.loop-impedance", "0.00001 ohm");
        var limit = Find(plan, Shipped.UnitedKingdom, "B/1", "reading-loop");
        var most = limit.Rules.Where(rule => rule.At.Rule.Id is "loop-reading-cold" or "loop-reading-at-temperature")
            .SelectMany(rule => rule.Kept).Where(kept => kept.Most is not null).Min(kept => kept.Most!.Value.Number);

        Assert.Equal(share * 2.185, most, 0.001);
    }

    [Fact]
    public void The_smallest_conductor_of_the_grouped_and_warm_circuit_is_the_published_one()
    {
        // Published example 040: ElectriciansForums.net thread 46075; 15 A BS 1361, Ca 0.87 (40 °C), Cg 0.7 (three circuits), 24 A and 32 A: 4 mm².
        var plan = Plans.Single(0.3, new()
        {
            ["device.standard"] = "BS 1361",
            ["device.rating"] = "15 A",
            ["serves"] = "[fixed-equipment]",
            ["load.current"] = "13 A",
            ["load.power-factor"] = "1",
            ["leg.construction"] = "single-core",
            ["leg.insulation"] = "thermoplastic 70",
            ["leg.csa"] = "10 mm²",
            ["leg.cpc"] = "4 mm²",
            ["leg.cpc-kind"] = "separate",
            ["leg.length"] = "10 m",
            ["leg.method"] = "B",
            ["leg.ambient"] = "40 °C",
            ["leg.grouped-circuits"] = "3",
            ["leg.grouping"] = "bunched",
        });
        var capacity = Find(plan, Shipped.UnitedKingdom, "B/1", "cable-size").Rules.Single(rule => rule.At.Rule.Id == "overload-capacity");

        Assert.Equal(4e-6, capacity.Kept[^1].Least!.Value.Number, 1e-12);
        Assert.Equal(2.5e-6, capacity.Kept[^1].Least!.Beyond.Number, 1e-12);
    }

    private static Plan Radial(string current) => Plans.Single(0.3, new()
    {
        ["device.standard"] = "EN 60898",
        ["device.curve"] = "B",
        ["device.rating"] = "20 A",
        ["serves"] = "[fixed-equipment]",
        ["load.current"] = current,
        ["load.power-factor"] = "1",
        ["leg.construction"] = "flat twin and earth",
        ["leg.insulation"] = "thermoplastic 70",
        ["leg.csa"] = "2.5 mm²",
        ["leg.length"] = "20 m",
        ["leg.method"] = "C",
    });

    private static double Most(InputLimit limit, string rule) => limit.Rules.Single(each => each.At.Rule.Id == rule).Kept[^1].Most!.Value.Number;

    private static InputLimit Find(Plan plan, RuleSet rules, string subject, string adjustment)
    {
        var design = plan.Build(rules);
        var input = Adjustables.WithLimits(design).Single(place => place.Subject.Key == subject && place.Adjustment.Id == adjustment);
        return LimitSearch.Run(design, [input]).Inputs[0];
    }
}
