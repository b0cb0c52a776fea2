namespace Auditor.Quantities.Tests;

public class QuantityTextTests
{
    [Theory]
    [InlineData("25 m", 25, "m")]
    [InlineData("25m", 25, "m")]
    [InlineData("  25   m  ", 25, "m")]
    [InlineData("25\u00A0m", 25, "m")]
    [InlineData("2.5 mm²", 2.5e-6, "mm²")]
    [InlineData("2.5 mm2", 2.5e-6, "mm²")]
    [InlineData("0.28 ohm", 0.28, "Ω")]
    [InlineData("30 mA", 0.03, "mA")]
    [InlineData("7.41 mΩ/m", 0.00741, "mΩ/m")]
    [InlineData("18 mV/A/m", 0.018, "mV/A/m")]
    [InlineData("115 A·s^½/mm²", 115e6, "A·s^½/mm²")]
    [InlineData("0.004 1/K", 0.004, "1/K")]
    [InlineData("0.004 /K", 0.004, "1/K")]
    [InlineData("3 m^-1", 3, "1/m")]
    [InlineData("-15 °C", -15, "°C")]
    [InlineData("\u221215 °C", -15, "°C")]
    [InlineData("+15 °C", 15, "°C")]
    [InlineData("4.5 %", 0.045, "%")]
    [InlineData("1.2e3 V", 1200, "V")]
    [InlineData("1.2E+3 V", 1200, "V")]
    [InlineData("12e-1V", 1.2, "V")]
    [InlineData(".5 s", 0.5, "s")]
    [InlineData("5. s", 5, "s")]
    [InlineData("0 A", 0, "A")]
    [InlineData("0.95", 0.95, "1")]
    [InlineData("3", 3, "1")]
    [InlineData("2 min", 120, "min")]
    public void A_number_and_its_unit_are_a_quantity(string text, double coherent, string unit)
    {
        StatedQuantity stated = Read(text);

        Assert.Equal(coherent, stated.Quantity.Value, Math.Abs(coherent) * 1e-15);
        Assert.Equal(unit, stated.Unit.Symbol);
        Assert.Equal(stated.Unit.Dimension, stated.Quantity.Dimension);
        Assert.Null(stated.Tolerance);
        Assert.Equal(Standing.Designed, stated.Standing);
    }

    [Theory]
    [InlineData("20 m ± 10 %", 2, 2, true)]
    [InlineData("20 m ±10%", 2, 2, true)]
    [InlineData("20m+-10%", 2, 2, true)]
    [InlineData("20 m +/- 10 %", 2, 2, true)]
    [InlineData("20 m +\u2212 10 %", 2, 2, true)]
    [InlineData("20 m ± 2 m", 2, 2, false)]
    [InlineData("20 m ± 200 mm", 0.2, 0.2, false)]
    [InlineData("20 m +3 m -0 m", 0, 3, false)]
    [InlineData("20 m -1 m +3 m", 1, 3, false)]
    [InlineData("20 m + 3 m \u2212 1 m", 1, 3, false)]
    [InlineData("20 m +10 % -5 %", 1, 2, true)]
    [InlineData("20 ± 10 %", 2, 2, true)]
    [InlineData("20 ± 2", 2, 2, false)]
    [InlineData("20 +3 -1", 1, 3, false)]
    [InlineData("20 % ± 0.02", 0.02, 0.02, false)]
    [InlineData("20 °C ± 5 K", 5, 5, false)]
    [InlineData("20 °C ± 5 °C", 5, 5, false)]
    [InlineData("-20 m ± 10 %", 2, 2, true)]
    public void A_tolerance_may_follow(string text, double below, double above, bool relative)
    {
        Tolerance? tolerance = Read(text).Tolerance;

        Assert.NotNull(tolerance);
        Assert.Equal(below, tolerance.Below, 1e-15);
        Assert.Equal(above, tolerance.Above, 1e-15);
        Assert.Equal(relative, tolerance.IsRelative);
    }

    [Theory]
    [InlineData("0.32 ohm ± 10 %, assumed", Standing.Assumed)]
    [InlineData("0.32 ohm, declared", Standing.Declared)]
    [InlineData("0.32 ohm,measured", Standing.Measured)]
    [InlineData("0.32 ohm , measured ", Standing.Measured)]
    [InlineData("0.8, assumed", Standing.Assumed)]
    [InlineData("0.32 ohm", Standing.Designed)]
    public void A_standing_may_follow(string text, Standing standing) =>
        Assert.Equal(standing, Read(text).Standing);

    [Theory]
    [InlineData("20 m", "20 m")]
    [InlineData("0.3 mm", "0.3 mm")]
    [InlineData("7 mA", "7 mA")]
    [InlineData("0.49 mm", "0.49 mm")]
    [InlineData("3.92 mV", "3.92 mV")]
    [InlineData("0.1 min", "0.1 min")]
    [InlineData("-0 m", "0 m")]
    [InlineData("20m+-10%", "20 m ± 10 %")]
    [InlineData("20 ohm -0 ohm +3 ohm", "20 Ω +3 Ω -0 Ω")]
    [InlineData("20 m +3 m -3 m", "20 m ± 3 m")]
    [InlineData("0 m ± 10 %", "0 m ± 10 %")]
    [InlineData("0.95 ± 0.02, assumed", "0.95 ± 0.02, assumed")]
    [InlineData("0.004 /K, declared", "0.004 1/K, declared")]
    [InlineData("5 degC ± 2 K, measured", "5 °C ± 2 K, measured")]
    [InlineData("3 kW / h", "3 kW/h")]
    public void A_quantity_is_written_in_its_preferred_spelling(string text, string written)
    {
        Assert.Equal(written, QuantityText.Write(Read(text)));
        Assert.Equal(written, Read(text).ToString());
    }

    [Fact]
    public void A_zero_has_no_sign() =>
        Assert.False(double.IsNegative(Read("-0 m").Quantity.Value));

    [Theory]
    [InlineData("20 m", 0.5, 0.5, "20 m ± 0.5 m")]
    [InlineData("20 mm", 0.001, 0.002, "20 mm +2 mm -1 mm")]
    [InlineData("20 %", 0.05, 0.05, "20 % ± 0.05")]
    [InlineData("20 °C", 5, 5, "20 °C ± 5 K")]
    [InlineData("20", 5, 5, "20 ± 5")]
    public void A_tolerance_that_was_worked_out_is_written_in_the_unit_of_its_value(
        string text, double below, double above, string written)
    {
        StatedQuantity stated = Read(text) with { Tolerance = new Tolerance(below, above) };

        Assert.Equal(written, QuantityText.Write(stated));
        Assert.Equal(below, Read(written).Tolerance!.Below);
        Assert.Equal(above, Read(written).Tolerance!.Above);
    }

    private static StatedQuantity Read(string text)
    {
        Assert.True(QuantityText.TryParse(text, out StatedQuantity? stated, out QuantityFault? fault), fault?.Message);
        Assert.Null(fault);
        return stated;
    }
}
