namespace Auditor.Quantities;

/// <summary>A physical quantity.</summary>
/// <param name="Value">The value in coherent units: V, A, m, s, K and their products; °C for a temperature.</param>
/// <param name="Dimension">What kind of quantity it is.</param>
public readonly record struct Quantity(double Value, Dimension Dimension)
{
    /// <summary>The quantity of so many of a unit.</summary>
    public static Quantity Of(double number, Unit unit) => new(unit.ToCoherent(number), unit.Dimension);

    /// <summary>The sum. A temperature and a difference of temperatures give a temperature.</summary>
    /// <exception cref="InvalidOperationException">The dimensions do not fit.</exception>
    public static Quantity operator +(Quantity left, Quantity right) =>
        left.Dimension.TryPlus(right.Dimension, out Dimension sum)
            ? new(left.Value + right.Value, sum)
            : throw Unfit("+", left, right);

    /// <summary>The difference. Two temperatures give a difference of temperatures.</summary>
    /// <exception cref="InvalidOperationException">The dimensions do not fit.</exception>
    public static Quantity operator -(Quantity left, Quantity right) =>
        left.Dimension.TryMinus(right.Dimension, out Dimension difference)
            ? new(left.Value - right.Value, difference)
            : throw Unfit("-", left, right);

    /// <summary>The product.</summary>
    /// <exception cref="InvalidOperationException">A temperature is multiplied.</exception>
    public static Quantity operator *(Quantity left, Quantity right) => new(left.Value * right.Value, left.Dimension * right.Dimension);

    /// <summary>The quotient.</summary>
    /// <exception cref="InvalidOperationException">A temperature is divided.</exception>
    public static Quantity operator /(Quantity left, Quantity right) => new(left.Value / right.Value, left.Dimension / right.Dimension);

    /// <summary>The number of units in this quantity.</summary>
    /// <exception cref="InvalidOperationException">The unit has another dimension.</exception>
    public double In(Unit unit) =>
        unit.Dimension == Dimension
            ? unit.FromCoherent(Value)
            : throw new InvalidOperationException($"a quantity in {Dimension} cannot be given in {unit}");

    private static InvalidOperationException Unfit(string operation, Quantity left, Quantity right) =>
        new($"{left.Dimension} {operation} {right.Dimension} has no meaning");
}
