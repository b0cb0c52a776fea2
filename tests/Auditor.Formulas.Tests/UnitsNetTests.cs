using CsCheck;
using UnitsNet;
using UnitsNet.Units;

namespace Auditor.Formulas.Tests;

/// <summary>Quantities in random units, worked out by UnitsNet as well.</summary>
public class UnitsNetTests
{
    private static readonly Gen<double> Numbers = Gen.Double[0.001, 1000];
    private static readonly Gen<(string Name, ElectricPotentialUnit Unit)> Volts = Gen.OneOf(
        ("V", ElectricPotentialUnit.Volt), ("kV", ElectricPotentialUnit.Kilovolt), ("mV", ElectricPotentialUnit.Millivolt));
    private static readonly Gen<(string Name, ElectricCurrentUnit Unit)> Amperes = Gen.OneOf(
        ("A", ElectricCurrentUnit.Ampere), ("kA", ElectricCurrentUnit.Kiloampere), ("mA", ElectricCurrentUnit.Milliampere));
    private static readonly Gen<(string Name, DurationUnit Unit)> Times = Gen.OneOf(
        ("s", DurationUnit.Second), ("ms", DurationUnit.Millisecond), ("min", DurationUnit.Minute), ("h", DurationUnit.Hour));

    [Fact]
    public void Ohms_law_holds_in_all_units() => Gen.Select(Numbers, Volts, Numbers, Amperes).Sample((u, volts, i, amperes) =>
    {
        var resistance = new ElectricPotential(u, volts.Unit) / new ElectricCurrent(i, amperes.Unit);

        Near(resistance.Ohms, $"({u:R} {volts.Name}) / ({i:R} {amperes.Name})");
    });

    [Fact]
    public void Power_and_energy_come_out_alike() => Gen.Select(Numbers, Volts, Numbers, Amperes, Numbers, Times).Sample((u, volts, i, amperes, t, times) =>
    {
        var power = new ElectricPotential(u, volts.Unit) * new ElectricCurrent(i, amperes.Unit);
        var energy = power * new Duration(t, times.Unit);

        Near((double)power.Watts, $"({u:R} {volts.Name}) * ({i:R} {amperes.Name})");
        Near(energy.Joules, $"({u:R} {volts.Name}) * ({i:R} {amperes.Name}) * ({t:R} {times.Name})");
    });

    [Fact]
    public void Temperatures_differ_alike() => Gen.Select(Gen.Double[-200, 1000], Gen.Double[-200, 1000]).Sample((a, b) =>
    {
        var difference = Temperature.FromDegreesCelsius(a) - Temperature.FromDegreesCelsius(b);

        Assert.Equal(difference.Kelvins, Bound.Number($"{Degrees(a)} - {Degrees(b)}"), 1e-9);
    });

    private static string Degrees(double number) => number.ToString("0.0################") + " degC";

    private static void Near(double expected, string formula) => Assert.Equal(expected, Bound.Number(formula), Math.Abs(expected) * 1e-12);
}
