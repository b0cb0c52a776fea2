using Auditor.Engine.Findings;

namespace Auditor.Rules.Tests.Network;

/// <summary>Three-phase sums of a whole design, against published and hand-worked figures.</summary>
public class NeutralCurrentTests
{
    /// <summary>V. K. Mehta and R. Mehta, Principles of Power System, example 14.7: 10, 8 and 5 kW from lines to neutral of 400 V, 231 V to neutral.</summary>
    private static readonly AuditedDesign Mehta = Loads(("L1", "10 kW"), ("L2", "8 kW"), ("L3", "5 kW"));

    [Theory]
    [InlineData("I_L1", 43.3)]
    [InlineData("I_L2", 34.6)]
    [InlineData("I_L3", 21.65)]
    [InlineData("I_N", 18.9)]
    public void Ten_eight_and_five_kilowatts_give_the_currents_of_the_textbook(string symbol, double printed) =>
        Assert.Equal(printed, Mehta.Number("B", symbol), 0.06);

    [Theory]
    [InlineData("L1", "L2", "L3")]
    [InlineData("L2", "L3", "L1")]
    [InlineData("L3", "L2", "L1")]
    [InlineData("L1", "L3", "L2")]
    public void The_neutral_current_does_not_ask_which_line_has_which_load(string first, string second, string third) =>
        Assert.Equal(18.9, Loads((first, "10 kW"), (second, "8 kW"), (third, "5 kW")).Number("B", "I_N"), 0.06);

    [Fact]
    public void Three_equal_loads_leave_no_current_in_the_neutral() =>
        Assert.Equal(0, Loads(("L1", "7 kW"), ("L2", "7 kW"), ("L3", "7 kW")).Number("B", "I_N"), 1e-6);

    [Fact]
    public void A_load_on_all_lines_adds_nothing_to_the_neutral() =>
        Assert.Equal(18.9, Loads(("L1", "10 kW"), ("L2", "8 kW"), ("L3", "5 kW"), ("L1-L2-L3", "9 kW")).Number("B", "I_N"), 0.06);

    [Fact]
    public void One_loaded_line_has_its_whole_current_in_the_neutral() =>
        Assert.Equal(43.29, Loads(("L2", "10 kW")).Number("B", "I_N"), 0.005);

    /// <summary>Of 10, 8 and 5 kW the mean is 7 2/3, and 5 lies 8/23 below it.</summary>
    [Fact]
    public void The_imbalance_is_the_greatest_departure_from_the_mean() =>
        Assert.Equal(0.34783, Mehta.Number("B", "imbalance"), 0.00001);

    [Fact]
    public void An_uneven_board_does_not_conform_and_an_even_one_does()
    {
        Assert.Equal(Verdict.Nonconforming, Balance(Mehta));
        Assert.Equal(Verdict.Conforms, Balance(Loads(("L1", "7 kW"), ("L2", "7.2 kW"), ("L3", "6.8 kW"))));
    }

    private static Verdict? Balance(AuditedDesign design) =>
        design.Audit().Findings.Single(finding => finding.Key == "phase-balance:B").Judgement.Verdict;

    private static AuditedDesign Loads(params (string Lines, string Power)[] loads)
    {
        var circuits = loads.Select((load, at) => $$"""
                  - id: {{at}}
                    phase: {{load.Lines}}
                    load: { power: {{load.Power}}, power-factor: 1 }
            """);
        return AuditedDesign.Read($$"""
            design-format: 1
            supply: { earthing: TN-S, phases: 3, voltage: 400 V, voltage-to-earth: 231 V }
            boards:
              - id: B
                circuits:
            {{string.Join('\n', circuits)}}
            """);
    }
}
