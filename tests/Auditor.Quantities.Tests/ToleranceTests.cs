namespace Auditor.Quantities.Tests;

public class ToleranceTests
{
    private static readonly Unit Metre = UnitCatalog.Find("m")!;
    private static readonly Unit Percent = UnitCatalog.Find("%")!;
    private static readonly Unit Celsius = UnitCatalog.Find("°C")!;

    [Fact]
    public void Per_cent_are_a_share_of_the_value()
    {
        var tolerance = Tolerance.Of(5, 10, Percent, Quantity.Of(20, Metre));

        Assert.Equal(1, tolerance.Below, 1e-15);
        Assert.Equal(2, tolerance.Above, 1e-15);
        Assert.True(tolerance.IsRelative);
        Assert.Equal(new WrittenTolerance(5, 10, Percent), tolerance.Written);
    }

    [Fact]
    public void Per_cent_of_a_negative_value_are_still_positive() =>
        Assert.Equal(2, Tolerance.Of(10, 10, Percent, Quantity.Of(-20, Metre)).Below, 1e-15);

    [Fact]
    public void Per_cent_of_a_value_in_per_cent_are_a_share_too()
    {
        var tolerance = Tolerance.Of(10, 10, Percent, Quantity.Of(4.5, Percent));

        Assert.Equal(0.0045, tolerance.Above, 1e-15);
    }

    [Fact]
    public void A_plain_number_is_an_absolute_tolerance_of_a_value_in_per_cent()
    {
        var tolerance = Tolerance.Of(0.01, 0.01, Unit.One, Quantity.Of(4.5, Percent));

        Assert.Equal(0.01, tolerance.Above);
        Assert.False(tolerance.IsRelative);
    }

    [Fact]
    public void A_tolerance_in_a_unit_is_absolute()
    {
        var tolerance = Tolerance.Of(200, 0, UnitCatalog.Find("mm")!, Quantity.Of(20, Metre));

        Assert.Equal(0.2, tolerance.Below);
        Assert.Equal(0, tolerance.Above);
        Assert.False(tolerance.IsRelative);
    }

    [Fact]
    public void A_temperature_has_its_tolerance_in_kelvins_or_degrees()
    {
        Assert.True(Tolerance.Suits(UnitCatalog.Find("K")!, Dimension.Temperature));
        Assert.True(Tolerance.Suits(Celsius, Dimension.Temperature));
        Assert.False(Tolerance.Suits(Percent, Dimension.Temperature));
        Assert.False(Tolerance.Suits(Metre, Dimension.Temperature));
        Assert.Equal(5, Tolerance.Of(5, 5, UnitCatalog.Find("K")!, Quantity.Of(30, Celsius)).Above);
    }

    [Fact]
    public void A_difference_of_temperatures_has_no_tolerance_in_degrees() =>
        Assert.False(Tolerance.Suits(Celsius, Dimension.TemperatureDifference));

    [Fact]
    public void A_tolerance_in_a_unit_that_does_not_suit_is_refused() =>
        Assert.Throws<InvalidOperationException>(() => Tolerance.Of(1, 1, Celsius, Quantity.Of(20, Metre)));

    [Theory]
    [InlineData(-1e-9, 0)]
    [InlineData(0, -1e-9)]
    [InlineData(double.NaN, 0)]
    [InlineData(0, double.PositiveInfinity)]
    public void A_side_is_zero_or_more(double below, double above) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => new Tolerance(below, above));

    [Fact]
    public void A_tolerance_that_was_worked_out_has_no_written_form()
    {
        var tolerance = new Tolerance(0, 0.5);

        Assert.Null(tolerance.Written);
        Assert.False(tolerance.IsRelative);
    }
}
