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
        if (IsTemperature)
        {
            result = this;
            return exponent == 1;
        }

        (double volt, double ampere, double metre, double second, double kelvin) =
            (_volt * exponent, _ampere * exponent, _metre * exponent, _second * exponent, _kelvin * exponent);
        return TryMake(volt, ampere, metre, second, kelvin, out result);
    }

    /// <summary>
    /// The dimension of a sum: of two equal dimensions, or of a temperature and a difference of temperatures. Two temperatures
    /// have no sum.
    /// </summary>
    public bool TryPlus(Dimension other, out Dimension sum)
    {
        bool exists = IsTemperature || other.IsTemperature
            ? this == TemperatureDifference || other == TemperatureDifference
            : this == other;
        sum = IsTemperature ? this : other;
        return exists;
    }

    /// <summary>
    /// The dimension of a difference: of two equal dimensions, or of a temperature less a difference of temperatures. Two
    /// temperatures differ by a <see cref="TemperatureDifference"/>.
    /// </summary>
    public bool TryMinus(Dimension other, out Dimension difference)
    {
        bool exists = this == other || (IsTemperature && other == TemperatureDifference);
        difference = IsTemperature && other.IsTemperature ? TemperatureDifference : this;
        return exists;
    }

    private static bool Fits(double doubled) => double.IsInteger(doubled) && doubled is >= sbyte.MinValue and <= sbyte.MaxValue;

    private static bool TryMake(double volt, double ampere, double metre, double second, double kelvin, out Dimension result)
    {
        bool fits = Fits(volt) && Fits(ampere) && Fits(metre) && Fits(second) && Fits(kelvin);
        result = fits ? new Dimension((int)volt, (int)ampere, (int)metre, (int)second, (int)kelvin, isTemperature: false) : None;
        return fits;
    }

    private static InvalidOperationException Unfit(Dimension left, string operation, Dimension right) =>
        new($"{left} {operation} {right} has no dimension");

    private bool TryCombine(Dimension other, int sign, out Dimension result)
    {
        if (IsTemperature || other.IsTemperature)
        {
            result = None;
            return false;
        }

        return TryMake(
            _volt + (sign * other._volt),
            _ampere + (sign * other._ampere),
            _metre + (sign * other._metre),
            _second + (sign * other._second),
            _kelvin + (sign * other._kelvin),
            out result);
    }
}
