namespace Auditor.Quantities.Tests;

public class QuantityTests
{
    private static readonly Unit Ohm = UnitCatalog.Find("Ω")!;
    private static readonly Unit Ampere = UnitCatalog.Find("A")!;
    private static readonly Unit Volt = UnitCatalog.Find("V")!;
    private static readonly Unit Celsius = UnitCatalog.Find("°C")!;
    private static readonly Unit Kelvin = UnitCatalog.Find("K")!;

    [Fact]
    public void Numbers_of_a_unit_become_coherent()
    {
        var length = Quantity.Of(250, UnitCatalog.Find("mm")!);

        Assert.Equal(new Quantity(0.25, Dimension.Length), length);
        Assert.Equal(25, length.In(UnitCatalog.Find("cm")!));
    }

    [Fact]
    public void A_quantity_is_not_given_in_a_unit_of_another_dimension() =>
        Assert.Throws<InvalidOperationException>(() => Quantity.Of(1, Ohm).In(Volt));

    [Fact]
    public void A_resistance_times_a_current_is_a_voltage()
    {
        Quantity drop = Quantity.Of(0.25, Ohm) * Quantity.Of(16, Ampere);

        Assert.Equal(4, drop.In(Volt));
    }

    [Fact]
    public void A_voltage_over_a_resistance_is_a_current()
    {
        Quantity current = Quantity.Of(230, Volt) / Quantity.Of(0.5, Ohm);

        Assert.Equal(460, current.In(Ampere));
    }

    [Fact]
    public void Equal_dimensions_add_and_subtract()
    {
        Assert.Equal(Quantity.Of(3.5, Ohm), Quantity.Of(3, Ohm) + Quantity.Of(0.5, Ohm));
        Assert.Equal(Quantity.Of(2.5, Ohm), Quantity.Of(3, Ohm) - Quantity.Of(0.5, Ohm));
    }

    [Fact]
    public void Temperatures_differ_by_kelvins_and_move_by_kelvins()
    {
        Quantity operating = Quantity.Of(70, Celsius);
        Quantity cold = Quantity.Of(20, Celsius);

        Assert.Equal(Quantity.Of(50, Kelvin), operating - cold);
        Assert.Equal(operating, cold + Quantity.Of(50, Kelvin));
        Assert.Equal(cold, operating - Quantity.Of(50, Kelvin));
    }

    [Fact]
    public void Sums_that_mean_nothing_are_refused()
    {
        Assert.Throws<InvalidOperationException>(() => Quantity.Of(70, Celsius) + Quantity.Of(20, Celsius));
        Assert.Throws<InvalidOperationException>(() => Quantity.Of(70, Ohm) + Quantity.Of(20, Volt));
        Assert.Throws<InvalidOperationException>(() => Quantity.Of(70, Ohm) - Quantity.Of(20, Volt));
    }

    [Fact]
    public void A_temperature_is_not_multiplied()
    {
        Assert.Throws<InvalidOperationException>(() => Quantity.Of(2, Unit.One) * Quantity.Of(20, Celsius));
        Assert.Throws<InvalidOperationException>(() => Quantity.Of(20, Celsius) / Quantity.Of(2, Unit.One));
    }
}
