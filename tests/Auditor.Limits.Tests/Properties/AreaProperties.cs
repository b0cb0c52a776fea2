using Auditor.Engine.Findings;
using CsCheck;

namespace Auditor.Limits.Tests.Properties;

/// <summary>
/// What larger conductors do, the protective conductor growing with the lines as the cable is made. Resistance falls, so that no drop and no
/// loop grows, nothing opens later, and what the conductors withstand grows.
/// <para>Two things worsen, because of physics. Fault currents grow, so that devices and cables further down have more to bear; here only the
/// cable itself is looked at. And the energy at its far end grows with the square of the current while the device opens at once: where one
/// conductor grows and another does not, as in flat cables of 2.5 mm² and 4 mm² that have the same protective conductor, the one that stays is
/// worse off. The current can grow no more than the conductor that grows most, and that is the property.</para>
/// <para>Fault currents are compared on either side of 16 mm² alone, since tables neglect reactance up to there: the greatest fault current
/// of a source without resistance falls by up to one part in a thousand where a larger cable brings the first reactance into the sum.</para>
/// </summary>
public class AreaProperties
{
    private const int Designs = 60;

    private static readonly string[] Sizes =
    [
        "1 mm²", "1.5 mm²", "2.5 mm²", "4 mm²", "6 mm²", "10 mm²", "16 mm²", "25 mm²", "35 mm²", "50 mm²", "70 mm²", "95 mm²", "120 mm²", "150 mm²", "185 mm²", "240 mm²", "300 mm²",
    ];

    private static readonly string[] Conductors = ["r1", "rn", "r2"];

    private static readonly Gen<(Plan Before, Plan After, string Circuit)> Larger =
        from plan in Plans.Any
        from leg in Gen.OneOf(plan.Stated.Keys.Where(key => key.Path == "csa").Select(key => key.Subject).ToArray())
        from steps in Gen.Int[1, 4]
        let at = Array.IndexOf(Sizes, plan.Stated[(leg, "csa")])
        let last = plan.Stated[(leg, "construction")] == "flat twin and earth" ? Array.IndexOf(Sizes, "16 mm²") : Sizes.Length - 1
        select (plan, plan.With(leg, "csa", Sizes[Math.Min(at + steps, last)]), leg[..leg.LastIndexOf('/')]);

    [Fact]
    public void No_figure_of_drop_or_loop_rises_and_no_least_fault_current_falls() => Sample((before, after, _) =>
    {
        foreach (var key in before.Keys("circuit"))
        {
            Each(Order.NeverRises, ["Vd", "vd", "vd_total", "R1R2", "Rs", "Zs", "t_sc", "t_oc"]);
            Each(Order.NeverFalls, ["If", "Isc_min", "If_min", "k2S2_line", "k2S2_cpc"]);

            void Each(Action<double?, double?, string> check, string[] symbols) =>
                Array.ForEach(symbols, symbol => check(before.Number(key, symbol), after.Number(key, symbol), $"{key} {symbol}"));
        }
    });

    [Fact]
    public void No_greatest_fault_current_falls_where_reactance_counts_before_and_after() => Sample((before, after, circuit) =>
    {
        if (Reactive(before, circuit) == Reactive(after, circuit))
        {
            Assert.All(before.Keys("circuit"), key => Order.NeverFalls(before.Number(key, "Ipf_max"), after.Number(key, "Ipf_max"), $"{key} Ipf_max"));
        }
    });

    [Fact]
    public void No_margin_of_voltage_drop_disconnection_or_time_worsens_and_none_that_is_kept_fails() => Sample((before, after, _) =>
        Rules.Each(before, after, [.. Rules.Drops, .. Rules.Disconnections, .. Rules.Times], (key, was, now) =>
        {
            Order.NeverFalls(was.Margin?.Absolute, now.Margin?.Absolute, $"{key} margin");
            Assert.False(was.Verdict == Verdict.Conforms && now.Verdict != Verdict.Conforms, $"{key} failed");
        }));

    [Fact]
    public void No_margin_of_withstand_at_the_near_end_of_the_cable_worsens() => Sample((before, after, circuit) =>
        Rules.Each(before, after, Rules.NearEnds, (key, was, now) =>
        {
            if (key.Subject == circuit)
            {
                Order.NeverFalls(was.Margin?.Absolute, now.Margin?.Absolute, $"{key} margin");
                Assert.False(was.Verdict == Verdict.Conforms && now.Verdict != Verdict.Conforms, $"{key} failed");
            }
        }));

    [Fact]
    public void Energy_at_the_far_end_grows_at_most_as_the_square_of_the_conductor_that_grows_most() => Sample((before, after, circuit) =>
    {
        var leg = circuit + "/leg 1";
        var growth = Conductors.Max(symbol => before.Number(leg, symbol) / after.Number(leg, symbol));
        Order.NeverRises(before.Number(circuit, "I2t_far_line") * growth * growth, after.Number(circuit, "I2t_far_line"), $"{circuit} I2t_far_line");
        if (before.Holds(circuit, "cleared_by_rcd") == after.Holds(circuit, "cleared_by_rcd"))
        {
            Order.NeverRises(before.Number(circuit, "I2t_far") * growth * growth, after.Number(circuit, "I2t_far"), $"{circuit} I2t_far");
        }
    });

    private static bool Reactive(Judged judged, string circuit) => judged.Number(circuit + "/leg 1", "x") > 0;

    private static void Sample(Action<Judged, Judged, string> check) => Larger.Sample(
        (before, after, circuit) => check(Judged.Of(before, Shipped.UnitedKingdom), Judged.Of(after, Shipped.UnitedKingdom), circuit), iter: Designs);
}
