using Auditor.Formulas.Values;

namespace Auditor.Formulas.Tests;

public class ArithmeticTests
{
    [Theory]
    [InlineData("2 + 3 * 4", 14)]
    [InlineData("(2 + 3) * 4", 20)]
    [InlineData("2 - 3 - 4", -5)]
    [InlineData("64 / 4 / 2", 8)]
    [InlineData("2 * 3 ^ 2", 18)]
    [InlineData("(-2) ^ 2", 4)]
    [InlineData("2 ^ -1", 0.5)]
    [InlineData("(2 ^ 3) ^ 2", 64)]
    [InlineData("27 ^ (1 / 3)", 3)]
    [InlineData("-5 + 3", -2)]
    [InlineData("2 - -3", 5)]
    [InlineData("1.5e3", 1500)]
    [InlineData("1.5E-3", 0.0015)]
    [InlineData("9007199254740993", 9007199254740992)]
    [InlineData("12345678901234567890123", 1.2345678901234568e22)]
    public void Arithmetic_follows_the_usual_order(string formula, double value) => Assert.Equal(value, Bound.Number(formula), 1e-12);

    [Theory]
    [InlineData("50 V / (30 mA)", 1666.6666666666667)]
    [InlineData("2.5 mm2", 2.5e-6)]
    [InlineData("0.4 s", 0.4)]
    [InlineData("400 ms", 0.4)]
    [InlineData("20 degC", 20)]
    [InlineData("-5 degC", -5)]
    [InlineData("20 degC - -5 degC", 25)]
    [InlineData("5 percent", 0.05)]
    [InlineData("0.004 per_K", 0.004)]
    [InlineData("7.41 mohm_per_m", 0.00741)]
    [InlineData("(7.41 mohm_per_m) * (25 m)", 0.18525)]
    [InlineData("115 A_rt_s_per_mm2", 115e6)]
    [InlineData("-30 mA", -0.03)]
    [InlineData("25V", 25)]
    public void A_number_before_a_unit_is_a_quantity(string formula, double coherent) =>
        Assert.Equal(coherent, Bound.Number(formula), Math.Abs(coherent) * 1e-15);

    /// <summary>The adiabatic equation of IEC 60364-5-54 543.1.2: 1000 A for 0.1 s at k = 115 need 2.75 mm² (√(10⁵) = 316.227766 A·s^½).</summary>
    [Fact]
    public void Half_powers_of_seconds_cancel_in_the_adiabatic_equation() =>
        Assert.Equal(2.749806661e-6, Bound.Number("sqrt((1000 A) ^ 2 * (0.1 s)) / (115 A_rt_s_per_mm2)"), 1e-14);

    /// <summary>Copper from 20 °C to 70 °C at 0.004 per kelvin has 1.2 times its resistance (Table I3 of the IET On-Site Guide, from memory).</summary>
    [Fact]
    public void A_temperature_less_a_temperature_scales_a_resistance() =>
        Assert.Equal(1.2, Bound.Number("1 + alpha * (theta - 20 degC)", new Thing(Plant.Circuit).Say(("alpha", "0.004 1/K"), ("theta", "70 °C"))), 1e-12);

    [Theory]
    [InlineData("1 / 0")]
    [InlineData("0 / 0")]
    [InlineData("U / (I - I)")]
    [InlineData("sqrt(0 - 1)")]
    [InlineData("(0 - 8) ^ 0.5")]
    [InlineData("0 ^ -1")]
    [InlineData("log(0)")]
    [InlineData("log(0 - 1)")]
    [InlineData("log10(0)")]
    [InlineData("exp(710)")]
    [InlineData("acos(1.0000001)")]
    [InlineData("1.0e308 * 10")]
    [InlineData("1.0e308 + 1.0e308")]
    [InlineData("-1.0e308 - 1.0e308")]
    [InlineData("10 ^ 400")]
    [InlineData("min(1, 1 / 0)")]
    public void What_has_no_finite_result_is_missing_and_never_a_number(string formula)
    {
        var value = Bound.Value(formula, new Thing(Plant.Circuit).Say(("U", "230 V"), ("I", "1 A")));

        var absence = Assert.Single(value.Absences.Items);
        Assert.Equal(AbsenceKind.NotFinite, absence.Kind);
        Assert.Equal("the calculation has no finite result (a division by zero, a root of a negative or an overflow)", absence.ToString());
    }

    [Theory]
    [InlineData("1 / 0 > 5")]
    [InlineData("1 / 0 <= 5")]
    [InlineData("sqrt(0 - 1) == sqrt(0 - 1)")]
    [InlineData("sqrt(0 - 1) != 1")]
    public void No_comparison_is_decided_on_what_has_no_finite_result(string formula) => Assert.Equal("missing", Bound.Truth(formula));

    [Fact]
    public void A_value_cannot_be_made_of_what_is_no_finite_number()
    {
        Assert.True(Value.Of(double.NaN).IsMissing);
        Assert.True(Value.Of(double.PositiveInfinity).IsMissing);
        Assert.True(Value.Of(double.NegativeInfinity, Marks.Assumed).IsMissing);
    }
}
