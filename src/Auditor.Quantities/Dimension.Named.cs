namespace Auditor.Quantities;

public readonly partial record struct Dimension
{
    /// <summary>A pure number.</summary>
    public static Dimension None => default;

    /// <summary>Voltage, in volts.</summary>
    public static Dimension Voltage { get; } = Of(1, 0, 0, 0, 0);

    /// <summary>Current, in amperes.</summary>
    public static Dimension Current { get; } = Of(0, 1, 0, 0, 0);

    /// <summary>Length, in metres.</summary>
    public static Dimension Length { get; } = Of(0, 0, 1, 0, 0);

    /// <summary>Time, in seconds.</summary>
    public static Dimension Time { get; } = Of(0, 0, 0, 1, 0);

    /// <summary>A difference of temperatures, in kelvins.</summary>
    public static Dimension TemperatureDifference { get; } = Of(0, 0, 0, 0, 1);

    /// <summary>A point on the Celsius scale, in degrees Celsius.</summary>
    public static Dimension Temperature { get; } = new(0, 0, 0, 0, 2, isTemperature: true);

    /// <summary>Resistance, reactance or impedance, in ohms.</summary>
    public static Dimension Resistance { get; } = Of(1, -1, 0, 0, 0);

    /// <summary>Resistance per length, in ohms per metre; the same as voltage drop per current and length.</summary>
    public static Dimension ResistancePerLength { get; } = Of(1, -1, -1, 0, 0);

    /// <summary>Active, reactive or apparent power, in watts, vars or volt-amperes.</summary>
    public static Dimension Power { get; } = Of(1, 1, 0, 0, 0);

    /// <summary>Energy, in joules.</summary>
    public static Dimension Energy { get; } = Of(1, 1, 0, 1, 0);

    /// <summary>Area, in square metres.</summary>
    public static Dimension Area { get; } = Of(0, 0, 2, 0, 0);

    /// <summary>Frequency, in hertz.</summary>
    public static Dimension Frequency { get; } = Of(0, 0, 0, -1, 0);

    /// <summary>Joule integral (let-through, I²t), in ampere squared seconds.</summary>
    public static Dimension JouleIntegral { get; } = Of(0, 2, 0, 1, 0);

    /// <summary>Thermal resistivity, in kelvin metres per watt.</summary>
    public static Dimension ThermalResistivity { get; } = Of(-1, -1, 1, 0, 1);

    /// <summary>Temperature coefficient, per kelvin.</summary>
    public static Dimension TemperatureCoefficient { get; } = Of(0, 0, 0, 0, -1);

    /// <summary>The factor k of a conductor in the adiabatic equation, in A·s^½/m².</summary>
    public static Dimension AdiabaticFactor { get; } = new(0, 2, -4, 1, 0, isTemperature: false);
}
