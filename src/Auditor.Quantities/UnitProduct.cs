namespace Auditor.Quantities;

/// <summary>A product of powers of catalogued units on its way to one unit. Exponents are doubled, so that one half is 1.</summary>
internal sealed class UnitProduct
{
    /// <summary>The largest whole exponent of a factor; with a half on top it may be this and a half.</summary>
    internal const int LargestExponent = 9;

    private const int MostFactors = 8;

    private readonly List<(Unit Unit, int Doubled)> _factors = [];

    /// <summary>
    /// Whether a unit may stand in a compound. Degree Celsius may not (a kelvin is meant), nor the unit of a pure number, nor a unit
    /// that is compound itself.
    /// </summary>
    internal static bool IsFactor(Unit unit) =>
        unit.Identifier.All(char.IsAsciiLetter) && !unit.Dimension.IsTemperature && !unit.Equals(Unit.One);

    internal void Multiply(Unit unit, int doubled)
    {
        int known = _factors.FindIndex(factor => factor.Unit.Equals(unit));
        if (known < 0)
        {
            _factors.Add((unit, doubled));
            return;
        }

        _factors[known] = (unit, _factors[known].Doubled + doubled);
    }

    /// <summary>
    /// The catalogued unit of this product where there is one, else a new one; null when there are more than eight factors or an
    /// exponent or the scale is out of range.
    /// </summary>
    internal Unit? ToUnit()
    {
        // In the order of the symbol, so that the scale is rounded in the same way however the product was written.
        (Unit Unit, int Doubled)[] factors =
        [
            .. _factors.Where(factor => factor.Doubled > 0),
            .. _factors.Where(factor => factor.Doubled < 0),
        ];
        if (factors.Length == 0)
        {
            return Unit.One;
        }

        if (factors.Length > MostFactors || Array.Exists(factors, factor => Math.Abs(factor.Doubled) > (2 * LargestExponent) + 1))
        {
            return null;
        }

        string symbol = UnitNotation.Symbol([.. factors.Select(factor => (factor.Unit.Symbol, factor.Doubled))]);
        return UnitCatalog.Catalogued(symbol) ?? Compound(factors, symbol);
    }

    private static double Power(double number, int doubled)
    {
        double power = doubled % 2 == 0 ? 1 : Math.Sqrt(number);
        for (int whole = doubled / 2; whole > 0; whole--)
        {
            power *= number;
        }

        return power;
    }

    private static Unit? Compound((Unit Unit, int Doubled)[] factors, string symbol)
    {
        (double multiplier, double divisor) = (1, 1);
        Dimension dimension = Dimension.None;
        foreach ((Unit unit, int doubled) in factors)
        {
            if (!unit.Dimension.TryPower(doubled / 2.0, out Dimension power) || !dimension.TryTimes(power, out dimension))
            {
                return null;
            }

            int size = Math.Abs(doubled);
            multiplier *= Power(doubled > 0 ? unit.Multiplier : unit.Divisor, size);
            divisor *= Power(doubled > 0 ? unit.Divisor : unit.Multiplier, size);
        }

        double scale = multiplier / divisor;
        string identifier = UnitNotation.Identifier([.. factors.Select(factor => (factor.Unit.Identifier, factor.Doubled))]);
        return double.IsNormal(scale) && double.IsNormal(1 / scale)
            ? new Unit(symbol, identifier, dimension, multiplier, divisor)
            : null;
    }
}
