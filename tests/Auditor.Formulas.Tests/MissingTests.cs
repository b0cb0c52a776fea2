namespace Auditor.Formulas.Tests;

/// <summary>
/// How what is missing spreads. In the formulas <c>Z</c>, <c>n</c>, <c>kind</c>, <c>wet</c> and <c>serves</c> are missing; <c>R</c>, <c>X</c> and
/// <c>on</c> are given.
/// </summary>
public class MissingTests
{
    private static Thing Circuit => new Thing(Plant.Circuit, "MSB/1").Say(("R", "0.4 Ω"), ("X", "0.1 Ω"), ("on", "true"), ("remark", "none"));

    [Theory]
    [InlineData("Z")]
    [InlineData("Zs")]
    [InlineData("param.cmin")]
    [InlineData("Z + R")]
    [InlineData("R + Z")]
    [InlineData("Z - R")]
    [InlineData("R - Z")]
    [InlineData("Z * 0")]
    [InlineData("0 * Z")]
    [InlineData("Z / R")]
    [InlineData("R / Z")]
    [InlineData("Z ^ 2")]
    [InlineData("n ^ 0")]
    [InlineData("1 ^ n")]
    [InlineData("-Z")]
    [InlineData("!wet")]
    [InlineData("Z < R")]
    [InlineData("R <= Z")]
    [InlineData("Z > R")]
    [InlineData("R >= Z")]
    [InlineData("Z == Z")]
    [InlineData("Z != R")]
    [InlineData("kind == 'ring'")]
    [InlineData("'ring' != kind")]
    [InlineData("wet == on")]
    [InlineData("on != wet")]
    [InlineData("Z ?? Z")]
    [InlineData("min(Z, R)")]
    [InlineData("min(R, X, Z)")]
    [InlineData("max(Z, R, X)")]
    [InlineData("sqrt(Z)")]
    [InlineData("abs(Z)")]
    [InlineData("log(n)")]
    [InlineData("log10(n)")]
    [InlineData("exp(n)")]
    [InlineData("sin(n)")]
    [InlineData("cos(n)")]
    [InlineData("acos(n)")]
    [InlineData("choose(wet, 1, 2)")]
    [InlineData("choose(on, Z, R)")]
    [InlineData("choose(!on, R, Z)")]
    [InlineData("one_of(kind, 'ring')")]
    [InlineData("has(serves, 'lighting')")]
    [InlineData("matches(kind, 'r.*')")]
    [InlineData("table('capacity', S, 'C')")]
    [InlineData("table('capacity', 1.5 mm2, kind)")]
    [InlineData("table('words', kind)")]
    [InlineData("round_up_to('sizes', S)")]
    [InlineData("trip_current(kind, 'B', 32 A, 5 s)")]
    [InlineData("trip_current('EN 60898', kind, 32 A, 5 s)")]
    [InlineData("trip_current('EN 60898', 'B', I, 5 s)")]
    [InlineData("trip_current('EN 60898', 'B', 32 A, t)")]
    [InlineData("trip_time('EN 60898', 'B', 32 A, I)")]
    [InlineData("up.Zdb")]
    [InlineData("fed.Zdb")]
    [InlineData("origin.Zs")]
    [InlineData("min_of(legs, r)")]
    [InlineData("max_of(legs, r)")]
    public void What_is_missing_makes_the_whole_missing(string formula) => Assert.Equal("missing", Bound.Truth(formula, Circuit));

    [Theory]
    [InlineData("Z ?? R", "0.4")]
    [InlineData("R ?? Z", "0.4")]
    [InlineData("Z ?? n * (1 ohm) ?? X", "0.1")]
    [InlineData("kind ?? 'any'", "any")]
    [InlineData("wet ?? false", "false")]
    [InlineData("serves ?? none", "")]
    [InlineData("(1 / 0) ?? 5", "5")]
    [InlineData("choose(on, R, Z)", "0.4")]
    [InlineData("choose(!on, Z, X)", "0.1")]
    [InlineData("choose(on, R, 1 ohm / 0)", "0.4")]
    [InlineData("choose(given(Z), Z, X)", "0.1")]
    [InlineData("given(Z)", "false")]
    [InlineData("given(R)", "true")]
    [InlineData("given(Z + R)", "false")]
    [InlineData("given(kind == 'ring')", "false")]
    [InlineData("given(Z) || on", "true")]
    [InlineData("has(serves ?? none, 'lighting')", "false")]
    [InlineData("sum_of(legs, r)", "0")]
    [InlineData("count_of(legs, buried)", "0")]
    public void Only_asking_giving_another_value_and_choosing_stop_it(string formula, string value) =>
        Assert.Equal(value, Bound.Shown(Bound.Value(formula, Circuit)));

    [Theory]
    [InlineData("true", "true", "true")]
    [InlineData("true", "false", "false")]
    [InlineData("true", "missing", "missing")]
    [InlineData("false", "true", "false")]
    [InlineData("false", "false", "false")]
    [InlineData("false", "missing", "false")]
    [InlineData("missing", "true", "missing")]
    [InlineData("missing", "false", "false")]
    [InlineData("missing", "missing", "missing")]
    public void And_is_three_valued(string left, string right, string both) => Assert.Equal(both, Bound.Truth("on && wet", Flags(left, right)));

    [Theory]
    [InlineData("true", "true", "true")]
    [InlineData("true", "false", "true")]
    [InlineData("true", "missing", "true")]
    [InlineData("false", "true", "true")]
    [InlineData("false", "false", "false")]
    [InlineData("false", "missing", "missing")]
    [InlineData("missing", "true", "true")]
    [InlineData("missing", "false", "missing")]
    [InlineData("missing", "missing", "missing")]
    public void Or_is_three_valued(string left, string right, string either) => Assert.Equal(either, Bound.Truth("on || wet", Flags(left, right)));

    [Theory]
    [InlineData("true", "false")]
    [InlineData("false", "true")]
    [InlineData("missing", "missing")]
    public void Not_is_three_valued(string flag, string contrary) => Assert.Equal(contrary, Bound.Truth("!on", Flags(flag, "true")));

    [Fact]
    public void Only_the_chosen_side_is_asked_for()
    {
        var circuit = Circuit.Say(("Zs", "1 Ω"));

        Assert.Equal(0.4, Bound.Number("choose(on, R, Zs)", circuit));
        Assert.Equal(0, circuit.Asked);
        Assert.Equal(1, Bound.Number("choose(!on, R, Zs)", circuit));
        Assert.Equal(1, circuit.Asked);
    }

    [Theory]
    [InlineData("on || given(Zs)")]
    [InlineData("!on && given(Zs)")]
    [InlineData("R ?? Zs")]
    public void A_side_that_changes_nothing_is_not_asked_for(string formula)
    {
        var circuit = Circuit;
        Bound.Value(formula, circuit);

        Assert.Equal(0, circuit.Asked);
    }

    [Theory]
    [InlineData("Z + R", "MSB/1: `Z` is not given")]
    [InlineData("Z + Z * 2", "MSB/1: `Z` is not given")]
    [InlineData("Z * S / t", "MSB/1: `Z` is not given\nMSB/1: `S` is not given\nMSB/1: `t` is not given")]
    [InlineData("Z ?? Zs", "MSB/1: `Z` is not given\nMSB/1: `Zs` is not known")]
    [InlineData("wet && kind == 'ring'", "MSB/1: `wet` is not given\nMSB/1: `kind` is not given")]
    [InlineData("on && wet", "MSB/1: `wet` is not given")]
    [InlineData("choose(wet, Z, R)", "MSB/1: `wet` is not given")]
    [InlineData("min(R, Z, Zs)", "MSB/1: `Z` is not given\nMSB/1: `Zs` is not known")]
    [InlineData("table('capacity', S, kind)", "MSB/1: `S` is not given\nMSB/1: `kind` is not given")]
    [InlineData("trip_current(kind, 'B', I, t)", "MSB/1: `kind` is not given\nMSB/1: `I` is not given\nMSB/1: `t` is not given")]
    [InlineData("fed.Zdb", "MSB/1: feeds no board")]
    [InlineData("up.up.Zs", "MSB/1: is on no board")]
    [InlineData("min_of(legs, r)", "MSB/1: there are no legs")]
    [InlineData("Z + 1 ohm / 0", "MSB/1: `Z` is not given\nthe calculation has no finite result (a division by zero, a root of a negative or an overflow)")]
    public void Each_thing_that_is_missing_is_told_once_in_the_order_met(string formula, string reasons) =>
        Assert.Equal(reasons, Bound.Reasons(Bound.Value(formula, Circuit)));

    [Fact]
    public void No_more_than_twelve_things_are_told()
    {
        var legs = Enumerable.Range(1, 40).Select(number => new Thing(Plant.Leg, $"leg {number}")).ToArray();
        var value = Bound.Value("sum_of(legs, r)", Circuit.Hold("legs", legs));

        Assert.Equal(12, value.Absences.Items.Count);
        Assert.Equal("leg 1: `r` is not given", value.Absences.Items[0].ToString());
        Assert.Equal("leg 12: `r` is not given", value.Absences.Items[^1].ToString());
    }

    private static Thing Flags(string on, string wet) =>
        new Thing(Plant.Circuit).Say([.. new[] { ("on", on), ("wet", wet) }.Where(pair => pair.Item2 != "missing")]);
}
