namespace Auditor.Quantities.Tests;

/// <summary>Each limit just inside, at, and just beyond.</summary>
public class QuantityLimitTests
{
    [Theory]
    [InlineData("999999999999999.9", true)]
    [InlineData("1e15", true)]
    [InlineData("-1e15", true)]
    [InlineData("1000000000000000.2", false)]
    [InlineData("-1000000000000000.2", false)]
    [InlineData("999999999999.9 km", true)]
    [InlineData("1e12 km", true)]
    [InlineData("1000000000000.1 km", false)]
    [InlineData("1e15 mm", true)]
    [InlineData("1000000000000000.2 mm", false)]
    public void A_number_reaches_to_a_thousand_million_million(string text, bool accepted) =>
        Assert.Equal(accepted, QuantityText.TryParse(text, out _, out _));

    [Theory]
    [InlineData("1.01e-15", true)]
    [InlineData("1e-15", true)]
    [InlineData("0.99e-15", false)]
    [InlineData("-0.99e-15", false)]
    [InlineData("0e-99", true)]
    [InlineData("1.01e-9 mm²", true)]
    [InlineData("1e-9 mm²", true)]
    [InlineData("0.99e-9 mm²", false)]
    [InlineData("0.99e-15 km", false)]
    public void A_number_other_than_zero_reaches_down_to_a_thousand_million_millionth(string text, bool accepted) =>
        Assert.Equal(accepted, QuantityText.TryParse(text, out _, out _));

    [Theory]
    [InlineData("-273.14 °C", true)]
    [InlineData("-273.15 °C", true)]
    [InlineData("-273.16 °C", false)]
    [InlineData("-273.16 K", true)]
    public void A_temperature_reaches_down_to_absolute_zero(string text, bool accepted) =>
        Assert.Equal(accepted, QuantityText.TryParse(text, out _, out _));

    [Theory]
    [InlineData("1 m ± 999999999999.9 km", true)]
    [InlineData("1 m ± 1e12 km", true)]
    [InlineData("1 m ± 1000000000000.1 km", false)]
    [InlineData("1 m +0 km -1000000000000.1 km", false)]
    [InlineData("1e15 m ± 100 %", true)]
    [InlineData("1e15 m ± 100.1 %", false)]
    [InlineData("1 m ± 0 m", true)]
    public void A_tolerance_reaches_as_far_as_a_number(string text, bool accepted) =>
        Assert.Equal(accepted, QuantityText.TryParse(text, out _, out _));
}
