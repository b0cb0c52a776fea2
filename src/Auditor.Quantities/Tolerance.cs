namespace Auditor.Quantities;

/// <summary>How far the true value may lie from the stated one.</summary>
/// <param name="Below">How far it may lie below, in coherent units of the quantity (K for a temperature); zero or more.</param>
/// <param name="Above">How far it may lie above, in the same units; zero or more.</param>
/// <exception cref="ArgumentOutOfRangeException">A side is negative, infinite or not a number.</exception>
public sealed record Tolerance(double Below, double Above)
{
    /// <summary>How far the true value may lie below, in coherent units; zero or more.</summary>
    public double Below { get; } = Checked(Below, nameof(Below));

    /// <summary>How far the true value may lie above, in coherent units; zero or more.</summary>
    public double Above { get; } = Checked(Above, nameof(Above));

    /// <summary>The two sides as stated, or null for a tolerance that was worked out.</summary>
    public WrittenTolerance? Written { get; private init; }

    /// <summary>True when it was stated as a share of the value, in per cent.</summary>
    public bool IsRelative => Written is { } written && written.Unit.Equals(UnitDefinitions.Percent);

    /// <summary>
    /// The tolerance of a value as stated in numbers of a unit. Per cent always means a share of the magnitude of the value, also
    /// where the value is itself in per cent.
    /// </summary>
    /// <exception cref="ArgumentOutOfRangeException">A side is negative, infinite or not a number.</exception>
    /// <exception cref="InvalidOperationException"><see cref="Suits"/> is false for the unit.</exception>
    public static Tolerance Of(double below, double above, Unit unit, Quantity value)
    {
        if (!Suits(unit, value.Dimension))
        {
            throw new InvalidOperationException($"a quantity in {value.Dimension} cannot have a tolerance in {unit}");
        }

        double share = unit.Equals(UnitDefinitions.Percent) ? Math.Abs(value.Value) : 1;
        return new Tolerance(share * unit.ToCoherent(below), share * unit.ToCoherent(above))
        {
            Written = new WrittenTolerance(below, above, unit),
        };
    }

    /// <summary>
    /// Whether a tolerance of a quantity can be stated in a unit: a unit of its dimension, or per cent; for a temperature K or °C, never
    /// per cent, because zero on the Celsius scale is arbitrary.
    /// </summary>
    public static bool Suits(Unit unit, Dimension quantity) =>
        unit.Dimension == quantity
        || (quantity.IsTemperature ? unit.Dimension == Dimension.TemperatureDifference : unit.Equals(UnitDefinitions.Percent));

    /// <summary>The unit in which to write an absolute tolerance of a value in a unit.</summary>
    internal static Unit UnitFor(Unit value) =>
        value.Dimension.IsTemperature ? UnitDefinitions.Kelvin : value.Equals(UnitDefinitions.Percent) ? Unit.One : value;

    private static double Checked(double side, string name) =>
        double.IsFinite(side) && side >= 0
            ? side
            : throw new ArgumentOutOfRangeException(name, side, "a tolerance is zero or more");
}
