using Auditor.Engine.Findings;
using CsCheck;

namespace Auditor.Limits.Tests.Properties;

/// <summary>
/// What a longer cable does. Its resistance and reactance grow, so that every drop and every loop grows and every fault current beyond it
/// falls; nothing that a device does with less current is done sooner.
/// <para>Two margins may improve, because of physics and of the standard, and each has its own property here. The energy I²t that conductors
/// must withstand falls with the current while the device opens at once, and grows where the time grows faster than the square of the
/// current falls. The limit of the voltage drop grows by 0.005 % a metre past 100 m of wiring (BS 7671 Appendix 4 6.4).</para>
/// <para>The time in which a fault to earth is cleared is that of the device which the standard lets count: where the loop grows too high
/// for the circuit-breaker, the residual current device takes over, and is the faster of the two.</para>
/// </summary>
public class LengthProperties
{
    private const int Designs = 60;

    private static readonly Gen<(Plan Before, Plan After, string Circuit)> Longer =
        from plan in Plans.Any
        from leg in Gen.OneOf(plan.Stated.Keys.Where(key => key.Path == "length").Select(key => key.Subject).ToArray())
        from more in Gen.Int[1, 2000]
        let metres = decimal.Parse(plan.Stated[(leg, "length")].Split(' ')[0]) + (more / 10m)
        select (plan, plan.With(leg, "length", $"{metres} m"), leg[..leg.LastIndexOf('/')]);

    [Fact]
    public void No_figure_of_drop_or_loop_falls_and_no_fault_current_rises() => Sample((before, after, _) =>
    {
        foreach (var key in before.Keys("circuit"))
        {
            Each(Order.NeverFalls, ["Vd", "vd", "vd_total", "R1R2", "Rs", "Xs", "Zs", "t_sc", "t_oc"]);
            Each(Order.NeverRises, ["If", "Isc_min", "If_min", "Ipf_max"]);
            if (before.Holds(key, "cleared_by_rcd") == after.Holds(key, "cleared_by_rcd"))
            {
                Each(Order.NeverFalls, ["t_dis"]);
            }

            void Each(Action<double?, double?, string> check, string[] symbols) =>
                Array.ForEach(symbols, symbol => check(before.Number(key, symbol), after.Number(key, symbol), $"{key} {symbol}"));
        }
    });

    [Fact]
    public void No_margin_of_voltage_drop_improves_but_by_the_allowance_for_long_wiring() => Sample((before, after, _) => Rules.Each(before, after, Rules.Drops, (key, was, now) =>
    {
        var allowed = key.Rule is "voltage-drop-lighting" or "voltage-drop-other" ? after.Number(key.Subject, "vd_allowance") - before.Number(key.Subject, "vd_allowance") : 0;
        Order.NeverRises(was.Margin?.Absolute, now.Margin?.Absolute - allowed, $"{key} margin");
    }));

    [Fact]
    public void No_margin_of_disconnection_improves_and_none_that_fails_comes_right() => Sample((before, after, _) => Rules.Each(before, after, Rules.Disconnections, (key, was, now) =>
    {
        Order.NeverRises(was.Margin?.Absolute, now.Margin?.Absolute, $"{key} margin");
        Assert.False(was.Verdict == Verdict.Nonconforming && now.Verdict == Verdict.Conforms, $"{key} came right");
    }));

    [Fact]
    public void Withstand_is_never_eased_by_a_shorter_time_and_the_near_end_of_the_cable_is_as_it_was() => Sample((before, after, circuit) =>
    {
        Rules.Each(before, after, Rules.Times, (key, was, now) => Order.NeverRises(was.Margin?.Absolute, now.Margin?.Absolute, $"{key} margin"));
        foreach (var rule in Rules.NearEnds)
        {
            Assert.Equal(before.Judgements[(rule, circuit)].Margin?.Absolute, after.Judgements[(rule, circuit)].Margin?.Absolute);
        }
    });

    /// <summary>A device that opens after the same time lets less energy through at less current; more of it needs more time.</summary>
    [Fact]
    public void Energy_at_the_far_end_grows_only_where_the_time_grows() => Sample((before, after, _) =>
    {
        foreach (var key in before.Keys("circuit"))
        {
            Check("I2t_far", "t_dis");
            Check("I2t_far_line", "t_sc");

            void Check(string energy, string time)
            {
                if (before.Number(key, time) == after.Number(key, time))
                {
                    Order.NeverRises(before.Number(key, energy), after.Number(key, energy), $"{key} {energy}");
                }
            }
        }
    });

    private static void Sample(Action<Judged, Judged, string> check) => Longer.Sample(
        (before, after, circuit) => check(Judged.Of(before, Shipped.UnitedKingdom), Judged.Of(after, Shipped.UnitedKingdom), circuit), iter: Designs);
}
