namespace Auditor.Quantities.Tests;

public class DimensionTests
{
    [Fact]
    public void The_default_dimension_is_a_pure_number()
    {
        Assert.True(default(Dimension).IsNone);
        Assert.Equal("1", default(Dimension).ToString());
    }

    [Fact]
    public void A_resistance_times_a_current_is_a_voltage() =>
        Assert.Equal(Dimension.Voltage, Dimension.Resistance * Dimension.Current);

    [Fact]
    public void A_power_over_a_voltage_is_a_current() =>
        Assert.Equal(Dimension.Current, Dimension.Power / Dimension.Voltage);

    [Fact]
    public void The_adiabatic_equation_gives_an_area()
    {
        Dimension area = Dimension.JouleIntegral.Sqrt() / Dimension.AdiabaticFactor;

        Assert.Equal(Dimension.Area, area);
    }

    [Fact]
    public void A_resistivity_times_a_length_over_an_area_is_a_resistance() =>
        Assert.Equal(Dimension.Resistance, Dimension.Of(1, -1, 1, 0, 0) * Dimension.Length / Dimension.Area);

    [Fact]
    public void Base_units_spell_a_dimension()
    {
        Assert.Equal("V/A", Dimension.Resistance.ToString());
        Assert.Equal("V·A", Dimension.Power.ToString());
        Assert.Equal("A·s^½/m²", Dimension.AdiabaticFactor.ToString());
        Assert.Equal("1/s", Dimension.Frequency.ToString());
        Assert.Equal("m·K/V/A", Dimension.ThermalResistivity.ToString());
        Assert.Equal("m^1.5", Dimension.Of(0, 0, 3, 0, 0).Sqrt().ToString());
        Assert.Equal("°C", Dimension.Temperature.ToString());
    }

    [Fact]
    public void A_quarter_power_does_not_exist() =>
        Assert.False(Dimension.Time.TryPower(0.25, out _));

    [Fact]
    public void The_root_of_a_root_does_not_exist() =>
        Assert.Throws<InvalidOperationException>(() => Dimension.Time.Sqrt().Sqrt());

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(1e300)]
    public void A_power_that_is_no_small_number_does_not_exist(double exponent) =>
        Assert.False(Dimension.Time.TryPower(exponent, out _));

    [Fact]
    public void A_pure_number_has_every_finite_power()
    {
        Assert.True(Dimension.None.TryPower(0.3, out Dimension power));
        Assert.True(power.IsNone);
    }

    [Fact]
    public void Exponents_reach_to_63_and_a_half()
    {
        Assert.True(Dimension.Length.TryPower(63.5, out _));
        Assert.False(Dimension.Length.TryPower(64, out _));
        Assert.True(Dimension.Length.TryPower(-64, out _));
        Assert.False(Dimension.Length.TryPower(-64.5, out _));
    }

    [Fact]
    public void A_product_out_of_range_is_refused()
    {
        Dimension most = Dimension.Of(0, 0, 63, 0, 0);

        Assert.False(most.TryTimes(Dimension.Length, out _));
        Assert.Throws<InvalidOperationException>(() => most * Dimension.Length);
    }

    [Fact]
    public void Whole_exponents_out_of_range_are_refused() =>
        Assert.Throws<OverflowException>(() => Dimension.Of(0, 0, 64, 0, 0));

    [Fact]
    public void A_temperature_combines_with_nothing()
    {
        Assert.Throws<InvalidOperationException>(() => Dimension.Temperature * Dimension.None);
        Assert.Throws<InvalidOperationException>(() => Dimension.Length / Dimension.Temperature);
        Assert.Throws<InvalidOperationException>(() => Dimension.Temperature.Sqrt());
        Assert.False(Dimension.Temperature.TryPower(2, out _));
        Assert.True(Dimension.Temperature.TryPower(1, out Dimension itself));
        Assert.Equal(Dimension.Temperature, itself);
    }

    [Fact]
    public void A_temperature_is_not_a_difference_of_temperatures()
    {
        Assert.NotEqual(Dimension.TemperatureDifference, Dimension.Temperature);
        Assert.False(Dimension.TemperatureDifference.IsTemperature);
        Assert.False(Dimension.Temperature.IsNone);
    }

    [Fact]
    public void Two_temperatures_differ_by_kelvins()
    {
        Assert.True(Dimension.Temperature.TryMinus(Dimension.Temperature, out Dimension difference));
        Assert.Equal(Dimension.TemperatureDifference, difference);
    }

    [Fact]
    public void A_temperature_plus_kelvins_is_a_temperature()
    {
        Assert.True(Dimension.Temperature.TryPlus(Dimension.TemperatureDifference, out Dimension sum));
        Assert.Equal(Dimension.Temperature, sum);
        Assert.True(Dimension.TemperatureDifference.TryPlus(Dimension.Temperature, out sum));
        Assert.Equal(Dimension.Temperature, sum);
        Assert.True(Dimension.Temperature.TryMinus(Dimension.TemperatureDifference, out Dimension difference));
        Assert.Equal(Dimension.Temperature, difference);
    }

    [Fact]
    public void Sums_that_mean_nothing_are_refused()
    {
        Assert.False(Dimension.Temperature.TryPlus(Dimension.Temperature, out _));
        Assert.False(Dimension.Temperature.TryPlus(Dimension.Length, out _));
        Assert.False(Dimension.TemperatureDifference.TryMinus(Dimension.Temperature, out _));
        Assert.False(Dimension.Length.TryPlus(Dimension.Time, out _));
        Assert.False(Dimension.Length.TryMinus(Dimension.None, out _));
    }

    [Fact]
    public void The_result_may_overwrite_an_operand()
    {
        Dimension dimension = Dimension.Voltage;

        Assert.True(dimension.TryTimes(Dimension.Current, out dimension));
        Assert.Equal(Dimension.Power, dimension);
        Assert.True(dimension.TryOver(Dimension.Current, out dimension));
        Assert.Equal(Dimension.Voltage, dimension);
        Assert.True(dimension.TryPower(2, out dimension));
        Assert.Equal(Dimension.Of(2, 0, 0, 0, 0), dimension);
        dimension = Dimension.Temperature;
        Assert.True(dimension.TryMinus(Dimension.Temperature, out dimension));
        Assert.Equal(Dimension.TemperatureDifference, dimension);
        Assert.True(dimension.TryPlus(Dimension.Temperature, out dimension));
        Assert.Equal(Dimension.Temperature, dimension);
    }
}
