namespace Auditor.Quantities;

public readonly partial record struct Dimension
{
    /// <summary>The dimension of a product.</summary>
    /// <exception cref="InvalidOperationException"><see cref="TryTimes"/> gives none.</exception>
    public static Dimension operator *(Dimension left, Dimension right) =>
        left.TryTimes(right, out Dimension product) ? product : throw Unfit(left, "times", right);

    /// <summary>The dimension of a quotient.</summary>
    /// <exception cref="InvalidOperationException"><see cref="TryOver"/> gives none.</exception>
    public static Dimension operator /(Dimension left, Dimension right) =>
        left.TryOver(right, out Dimension quotient) ? quotient : throw Unfit(left, "over", right);

    /// <summary>The dimension of a square root.</summary>
    /// <exception cref="InvalidOperationException">An exponent would not be a multiple of one half, or this is a temperature.</exception>
    public Dimension Sqrt() =>
        TryPower(0.5, out Dimension root) ? root : throw new InvalidOperationException($"{this} has no square root");

    /// <summary>The dimension of a product; false for a temperature, and when an exponent leaves −64 to 63.5.</summary>
    public bool TryTimes(Dimension other, out Dimension product) => TryCombine(other, 1, out product);

    /// <summary>The dimension of a quotient; false for a temperature, and when an exponent leaves −64 to 63.5.</summary>
    public bool TryOver(Dimension other, out Dimension quotient) => TryCombine(other, -1, out quotient);

    /// <summary>
    /// The dimension of a power; false when an exponent would not be a multiple of one half or leaves −64 to 63.5, and for a
    /// temperature raised to anything but one.
    /// </summary>
    public bool TryPower(double exponent, out Dimension result)
    {
        result = this;
        if (IsTemperature)
        {
            return exponent == 1;
        }

        return Fits(_volt * exponent) && Fits(_ampere * exponent) && Fits(_metre * exponent)
            && Fits(_second * exponent) && Fits(_kelvin * exponent)
            && TryMake(
                (int)(_volt * exponent),
                (int)(_ampere * exponent),
                (int)(_metre * exponent),
                (int)(_second * exponent),
                (int)(_kelvin * exponent),
                out result);
    }

    /// <summary>
    /// The dimension of a sum: of two equal dimensions, or of a temperature and a difference of temperatures. Two temperatures
    /// have no sum.
    /// </summary>
    public bool TryPlus(Dimension other, out Dimension sum)
    {
        sum = IsTemperature ? this : other;
        return IsTemperature || other.IsTemperature
            ? this == TemperatureDifference || other == TemperatureDifference
            : this == other;
    }

    /// <summary>
    /// The dimension of a difference: of two equal dimensions, or of a temperature less a difference of temperatures. Two
    /// temperatures differ by a <see cref="TemperatureDifference"/>.
    /// </summary>
    public bool TryMinus(Dimension other, out Dimension difference)
    {
        difference = IsTemperature && other.IsTemperature ? TemperatureDifference : this;
        return this == other || (IsTemperature && other == TemperatureDifference);
    }

    private static bool Fits(double doubled) => double.IsInteger(doubled) && doubled is >= sbyte.MinValue and <= sbyte.MaxValue;

    private static bool TryMake(int volt, int ampere, int metre, int second, int kelvin, out Dimension result)
    {
        bool fits = Fits(volt) && Fits(ampere) && Fits(metre) && Fits(second) && Fits(kelvin);
        result = fits ? new Dimension(volt, ampere, metre, second, kelvin, isTemperature: false) : None;
        return fits;
    }

    private static InvalidOperationException Unfit(Dimension left, string operation, Dimension right) =>
        new($"{left} {operation} {right} has no dimension");

    private bool TryCombine(Dimension other, int sign, out Dimension result)
    {
        result = None;
        return !IsTemperature && !other.IsTemperature && TryMake(
            _volt + (sign * other._volt),
            _ampere + (sign * other._ampere),
            _metre + (sign * other._metre),
            _second + (sign * other._second),
            _kelvin + (sign * other._kelvin),
            out result);
    }
}
