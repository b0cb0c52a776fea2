namespace Auditor.Quantities;

/// <summary>
/// The physical dimension of a quantity: exponents over volt, ampere, metre, second and kelvin, each a multiple of one half.
/// </summary>
/// <remarks>
/// Volt and ampere stand in for mass, because every quantity of an electrical installation reduces to them: an ohm is V/A, a watt
/// V·A, a joule V·A·s (IEC 80000-6). Half exponents occur in practice: the factor k of a conductor is in A·s^½/mm² (IEC 60364-5-54).
/// A point on the Celsius scale is a dimension of its own, because it can be neither scaled nor multiplied:
/// see <see cref="IsTemperature"/>.
/// The default value is <see cref="None"/>.
/// </remarks>
public readonly partial record struct Dimension
{
    private readonly sbyte _volt;
    private readonly sbyte _ampere;
    private readonly sbyte _metre;
    private readonly sbyte _second;
    private readonly sbyte _kelvin;

    private Dimension(int volt, int ampere, int metre, int second, int kelvin, bool isTemperature)
    {
        _volt = checked((sbyte)volt);
        _ampere = checked((sbyte)ampere);
        _metre = checked((sbyte)metre);
        _second = checked((sbyte)second);
        _kelvin = checked((sbyte)kelvin);
        IsTemperature = isTemperature;
    }

    /// <summary>True for a point on the Celsius scale, false for everything else, a difference of temperatures included.</summary>
    public bool IsTemperature { get; }

    /// <summary>True for a pure number: no exponent differs from zero.</summary>
    public bool IsNone => this == None;

    /// <summary>The dimension with these whole exponents.</summary>
    /// <exception cref="OverflowException">An exponent lies outside −64 to 63.</exception>
    public static Dimension Of(int volt, int ampere, int metre, int second, int kelvin) =>
        checked(new(2 * volt, 2 * ampere, 2 * metre, 2 * second, 2 * kelvin, isTemperature: false));

    /// <summary>
    /// The dimension in base units: <c>V/A</c>, <c>A·s^½/m²</c>, <c>1</c> for a pure number, <c>°C</c> for a temperature.
    /// </summary>
    public override string ToString() => IsTemperature
        ? "°C"
        : UnitNotation.Symbol([("V", _volt), ("A", _ampere), ("m", _metre), ("s", _second), ("K", _kelvin)]);
}
