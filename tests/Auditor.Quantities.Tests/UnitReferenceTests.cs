using UnitsNet;
using UnitsNet.Units;

namespace Auditor.Quantities.Tests;

/// <summary>The catalogue against UnitsNet, which defines the same units independently.</summary>
public class UnitReferenceTests
{
    private static readonly Dictionary<string, (Enum Unit, Enum Coherent)> Known = new()
    {
        ["1"] = (RatioUnit.DecimalFraction, RatioUnit.DecimalFraction),
        ["%"] = (RatioUnit.Percent, RatioUnit.DecimalFraction),
        ["V"] = (ElectricPotentialUnit.Volt, ElectricPotentialUnit.Volt),
        ["kV"] = (ElectricPotentialUnit.Kilovolt, ElectricPotentialUnit.Volt),
        ["mV"] = (ElectricPotentialUnit.Millivolt, ElectricPotentialUnit.Volt),
        ["A"] = (ElectricCurrentUnit.Ampere, ElectricCurrentUnit.Ampere),
        ["kA"] = (ElectricCurrentUnit.Kiloampere, ElectricCurrentUnit.Ampere),
        ["mA"] = (ElectricCurrentUnit.Milliampere, ElectricCurrentUnit.Ampere),
        ["Ω"] = (ElectricResistanceUnit.Ohm, ElectricResistanceUnit.Ohm),
        ["mΩ"] = (ElectricResistanceUnit.Milliohm, ElectricResistanceUnit.Ohm),
        ["kΩ"] = (ElectricResistanceUnit.Kiloohm, ElectricResistanceUnit.Ohm),
        ["MΩ"] = (ElectricResistanceUnit.Megaohm, ElectricResistanceUnit.Ohm),
        ["m"] = (LengthUnit.Meter, LengthUnit.Meter),
        ["km"] = (LengthUnit.Kilometer, LengthUnit.Meter),
        ["mm"] = (LengthUnit.Millimeter, LengthUnit.Meter),
        ["cm"] = (LengthUnit.Centimeter, LengthUnit.Meter),
        ["m²"] = (AreaUnit.SquareMeter, AreaUnit.SquareMeter),
        ["mm²"] = (AreaUnit.SquareMillimeter, AreaUnit.SquareMeter),
        ["s"] = (DurationUnit.Second, DurationUnit.Second),
        ["ms"] = (DurationUnit.Millisecond, DurationUnit.Second),
        ["min"] = (DurationUnit.Minute, DurationUnit.Second),
        ["h"] = (DurationUnit.Hour, DurationUnit.Second),
        ["°C"] = (TemperatureUnit.DegreeCelsius, TemperatureUnit.DegreeCelsius),
        ["K"] = (TemperatureDeltaUnit.DegreeCelsius, TemperatureDeltaUnit.Kelvin),
        ["1/K"] = (CoefficientOfThermalExpansionUnit.PerDegreeCelsius, CoefficientOfThermalExpansionUnit.PerKelvin),
        ["W"] = (PowerUnit.Watt, PowerUnit.Watt),
        ["kW"] = (PowerUnit.Kilowatt, PowerUnit.Watt),
        ["MW"] = (PowerUnit.Megawatt, PowerUnit.Watt),
        ["VA"] = (ElectricApparentPowerUnit.Voltampere, ElectricApparentPowerUnit.Voltampere),
        ["kVA"] = (ElectricApparentPowerUnit.Kilovoltampere, ElectricApparentPowerUnit.Voltampere),
        ["MVA"] = (ElectricApparentPowerUnit.Megavoltampere, ElectricApparentPowerUnit.Voltampere),
        ["var"] = (ElectricReactivePowerUnit.VoltampereReactive, ElectricReactivePowerUnit.VoltampereReactive),
        ["kvar"] = (ElectricReactivePowerUnit.KilovoltampereReactive, ElectricReactivePowerUnit.VoltampereReactive),
        ["J"] = (EnergyUnit.Joule, EnergyUnit.Joule),
        ["Wh"] = (EnergyUnit.WattHour, EnergyUnit.Joule),
        ["kWh"] = (EnergyUnit.KilowattHour, EnergyUnit.Joule),
        ["Hz"] = (FrequencyUnit.Hertz, FrequencyUnit.Hertz),
        ["kHz"] = (FrequencyUnit.Kilohertz, FrequencyUnit.Hertz),
    };

    /// <summary>Units that UnitsNet lacks, as products of units that it has. Only the half exponent of the adiabatic factor is beyond
    /// it.</summary>
    private static readonly Dictionary<string, (string Known, int Exponent)[]> Composed = new()
    {
        ["Ω/m"] = [("Ω", 1), ("m", -1)],
        ["mΩ/m"] = [("mΩ", 1), ("m", -1)],
        ["Ω/km"] = [("Ω", 1), ("km", -1)],
        ["mV/A/m"] = [("mV", 1), ("A", -1), ("m", -1)],
        ["A²s"] = [("A", 2), ("s", 1)],
        ["kA²s"] = [("kA", 2), ("s", 1)],
        ["K·m/W"] = [("K", 1), ("m", 1), ("W", -1)],
    };

    public static TheoryData<string> KnownSymbols => [.. Known.Keys];

    public static TheoryData<string> ComposedSymbols => [.. Composed.Keys];

    [Fact]
    public void Every_catalogued_unit_has_a_reference() =>
        Assert.Equal(
            UnitCatalog.All.Select(unit => unit.Symbol).Order(StringComparer.Ordinal),
            Known.Keys.Concat(Composed.Keys).Append("A·s^½/mm²").Order(StringComparer.Ordinal));

    [Theory]
    [MemberData(nameof(KnownSymbols))]
    public void The_scale_agrees_with_the_reference(string symbol)
    {
        double scale = ScaleOf(symbol);

        Assert.Equal(scale, UnitCatalog.Find(symbol)!.Scale, scale * 1e-12);
        Assert.Equal(37.5 * scale, UnitCatalog.Find(symbol)!.ToCoherent(37.5), scale * 1e-10);
        Assert.Equal(37.5, UnitCatalog.Find(symbol)!.FromCoherent(37.5 * scale), 1e-10);
    }

    [Theory]
    [MemberData(nameof(KnownSymbols))]
    public void The_dimension_agrees_with_the_reference(string symbol)
    {
        Dimension dimension = UnitCatalog.Find(symbol)!.Dimension;
        Dimension expected = DimensionOf(Known[symbol].Unit);

        Assert.Equal(symbol == "°C" ? Dimension.TemperatureDifference : dimension, expected);
        Assert.Equal(symbol == "°C", dimension.IsTemperature);
    }

    [Theory]
    [MemberData(nameof(ComposedSymbols))]
    public void A_composed_unit_agrees_with_its_factors_in_the_reference(string symbol)
    {
        (double scale, Dimension dimension) = (1, Dimension.None);
        foreach ((string known, int exponent) in Composed[symbol])
        {
            scale *= Math.Pow(ScaleOf(known), exponent);
            Assert.True(DimensionOf(Known[known].Unit).TryPower(exponent, out Dimension power));
            dimension *= power;
        }

        Assert.Equal(scale, UnitCatalog.Find(symbol)!.Scale, scale * 1e-12);
        Assert.Equal(dimension, UnitCatalog.Find(symbol)!.Dimension);
    }

    private static double ScaleOf(string symbol) => UnitConverter.Convert(1, Known[symbol].Unit, Known[symbol].Coherent);

    /// <summary>From length, mass, time, current and temperature to volt, ampere, metre, second, kelvin: 1 kg is 1 V·A·s³/m².</summary>
    private static Dimension DimensionOf(Enum unit)
    {
        BaseDimensions si = UnitsNet.Quantity.From(1, unit).QuantityInfo.BaseDimensions;
        return Dimension.Of(si.Mass, si.Mass + si.Current, si.Length - (2 * si.Mass), si.Time + (3 * si.Mass), si.Temperature);
    }
}
