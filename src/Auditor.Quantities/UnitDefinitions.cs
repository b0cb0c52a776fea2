namespace Auditor.Quantities;

/// <summary>
/// The catalogued units with their definitions: SI units and prefixes, units accepted beside them (min, h, W·h) by the SI brochure
/// (BIPM, 9th edition, tables 2, 4, 7 and 8), V·A and var by IEC 80000-6, per cent by ISO 80000-1. The order within a dimension is the
/// order in which people are told of them: the coherent unit first.
/// </summary>
internal static class UnitDefinitions
{
    /// <summary>The unit of tolerances that are shares of the value.</summary>
    internal static readonly Unit Percent = new("%", "percent", Dimension.None, 1, 100);

    /// <summary>The unit of tolerances of a temperature.</summary>
    internal static readonly Unit Kelvin = new("K", "K", Dimension.TemperatureDifference, 1, 1);

    internal static readonly Unit[] All =
    [
        Unit.One,
        Percent,

        Simple("V", Dimension.Voltage),
        Simple("kV", Dimension.Voltage, 1000),
        Simple("mV", Dimension.Voltage, 1, 1000),

        Simple("A", Dimension.Current),
        Simple("kA", Dimension.Current, 1000),
        Simple("mA", Dimension.Current, 1, 1000),

        Ohmic("Ω", "ohm", Dimension.Resistance),
        Ohmic("mΩ", "mohm", Dimension.Resistance, 1, 1000),
        Ohmic("kΩ", "kohm", Dimension.Resistance, 1e3),
        Ohmic("MΩ", "Mohm", Dimension.Resistance, 1e6),

        Simple("m", Dimension.Length),
        Simple("km", Dimension.Length, 1000),
        Simple("mm", Dimension.Length, 1, 1000),
        Simple("cm", Dimension.Length, 1, 100),

        new("m²", "m2", Dimension.Area, 1, 1),
        new("mm²", "mm2", Dimension.Area, 1, 1e6),

        Simple("s", Dimension.Time),
        Simple("ms", Dimension.Time, 1, 1000),
        Simple("min", Dimension.Time, 60),
        Simple("h", Dimension.Time, 3600),

        new("°C", "degC", Dimension.Temperature, 1, 1),
        Kelvin,
        new("1/K", "per_K", Dimension.TemperatureCoefficient, 1, 1, "/K"),

        Simple("W", Dimension.Power),
        Simple("kW", Dimension.Power, 1e3),
        Simple("MW", Dimension.Power, 1e6),
        Simple("VA", Dimension.Power),
        Simple("kVA", Dimension.Power, 1e3),
        Simple("MVA", Dimension.Power, 1e6),
        Simple("var", Dimension.Power),
        Simple("kvar", Dimension.Power, 1e3),

        Simple("J", Dimension.Energy),
        Simple("Wh", Dimension.Energy, 3600),
        Simple("kWh", Dimension.Energy, 3.6e6),

        Simple("Hz", Dimension.Frequency),
        Simple("kHz", Dimension.Frequency, 1000),

        Ohmic("Ω/m", "ohm_per_m", Dimension.ResistancePerLength, 1, 1, "ohm/m"),
        Ohmic("mΩ/m", "mohm_per_m", Dimension.ResistancePerLength, 1, 1000, "mohm/m"),
        Ohmic("Ω/km", "ohm_per_km", Dimension.ResistancePerLength, 1, 1000, "ohm/km"),
        new("mV/A/m", "mV_per_A_m", Dimension.ResistancePerLength, 1, 1000, "mV/(A·m)"),

        new("A²s", "A2s", Dimension.JouleIntegral, 1, 1, "A²·s"),
        new("kA²s", "kA2s", Dimension.JouleIntegral, 1e6, 1, "kA²·s"),

        new("K·m/W", "K_m_per_W", Dimension.ThermalResistivity, 1, 1, "m·K/W", "K.m/W", "K m/W"),
        new("A·s^½/mm²", "A_rt_s_per_mm2", Dimension.AdiabaticFactor, 1e6, 1, "A√s/mm²"),
    ];

    private static Unit Simple(string symbol, Dimension dimension, double multiplier = 1, double divisor = 1) =>
        new(symbol, symbol, dimension, multiplier, divisor);

    /// <summary>A unit with an omega, which is also accepted as the ohm sign, U+2126, that some keyboards yield.</summary>
    private static Unit Ohmic(
        string symbol, string identifier, Dimension dimension, double multiplier = 1, double divisor = 1, params string[] spellings) =>
        new(symbol, identifier, dimension, multiplier, divisor, [.. spellings, symbol.Replace('Ω', '\u2126')]);
}
