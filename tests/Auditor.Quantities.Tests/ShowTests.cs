using CsCheck;

namespace Auditor.Quantities.Tests;

public class ShowTests
{
    [Theory]
    [InlineData(1.37, "Ω", "1.37 Ω")]
    [InlineData(0.2196, "Ω", "0.2196 Ω")]
    [InlineData(0.05, "%", "5 %")]
    [InlineData(30, "°C", "30 °C")]
    [InlineData(-5, "°C", "-5 °C")]
    [InlineData(0.03, "mA", "30 mA")]
    [InlineData(0.95, "1", "0.95")]
    [InlineData(0, "A", "0 A")]
    [InlineData(2.5e-6, "mm²", "2.5 mm²")]
    [InlineData(1200, "V", "1200 V")]
    [InlineData(0.00741, "mΩ/m", "7.41 mΩ/m")]
    [InlineData(82656.25, "A²s", "82660 A²s")]
    [InlineData(100000, "V", "100000 V")]
    [InlineData(1234567, "V", "1235000 V")]
    public void A_value_is_shown_with_its_unit(double coherent, string unit, string shown) =>
        Assert.Equal(shown, QuantityText.Show(coherent, UnitCatalog.Find(unit)!));

    [Theory]
    [InlineData(1.2344, "1.234")]
    [InlineData(1.2346, "1.235")]
    [InlineData(0.99996, "1")]
    [InlineData(9.9994, "9.999")]
    [InlineData(9.9996, "10")]
    [InlineData(12.345678, "12.35")]
    [InlineData(1234.4, "1234")]
    [InlineData(9999.6, "10000")]
    [InlineData(100.04, "100")]
    [InlineData(-0.012345, "-0.01235")]
    public void A_number_is_shown_with_four_significant_digits_at_most(double number, string shown) =>
        Assert.Equal(shown, QuantityText.ShowNumber(number, Unit.One));

    [Theory]
    [InlineData(0.00009999, "9.999×10⁻⁵")]
    [InlineData(0.000099996, "0.0001")]
    [InlineData(0.0001, "0.0001")]
    [InlineData(0.0001001, "0.0001001")]
    [InlineData(9999000, "9999000")]
    [InlineData(9999600, "1×10⁷")]
    [InlineData(10000000, "1×10⁷")]
    [InlineData(10010000, "1.001×10⁷")]
    [InlineData(-15000000, "-1.5×10⁷")]
    [InlineData(1e100, "1×10¹⁰⁰")]
    [InlineData(5e-324, "4.941×10⁻³²⁴")]
    public void Powers_of_ten_serve_very_small_and_very_large_numbers_only(double number, string shown) =>
        Assert.Equal(shown, QuantityText.ShowNumber(number, Unit.One));

    [Theory]
    [InlineData(double.PositiveInfinity, "∞ V")]
    [InlineData(double.NegativeInfinity, "-∞ V")]
    [InlineData(double.NaN, "NaN V")]
    public void What_is_not_finite_is_shown_as_such(double coherent, string shown) =>
        Assert.Equal(shown, QuantityText.Show(coherent, UnitCatalog.Find("V")!));

    [Fact]
    public void A_negative_zero_is_shown_as_zero() =>
        Assert.Equal("0 A", QuantityText.Show(-0.0, UnitCatalog.Find("A")!));

    [Fact]
    public void What_is_shown_lies_within_half_of_the_fourth_digit() =>
        Gen.Double[1e-4, 9.99e6].Sample(
            number =>
            {
                string shown = QuantityText.ShowNumber(number, Unit.One);
                Assert.True(QuantityText.TryParse(shown, out StatedQuantity? back, out _));
                Assert.Equal(number, back.Quantity.Value, number * 0.000501);
                Assert.InRange(shown.Replace(".", "", StringComparison.Ordinal).Trim('0').Length, 1, 4);
            },
            iter: 20_000);
}
