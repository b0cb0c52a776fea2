using System.Globalization;

namespace Auditor.Quantities;

/// <summary>Numbers as text.</summary>
internal static class NumberText
{
    /// <summary>
    /// The end of the number without a sign that starts at an offset, or the offset itself where none does. The form is that of numbers in
    /// YAML 1.2 (core schema, 10.3.2): <c>25</c>, <c>0.28</c>, <c>.5</c>, <c>5.</c>, <c>1.2e-3</c>.
    /// </summary>
    internal static int EndOfNumber(ReadOnlySpan<char> text, int start)
    {
        int whole = EndOfDigits(text, start);
        int end = whole < text.Length && text[whole] == '.' ? EndOfDigits(text, whole + 1) : whole;
        if (end - start == (end == whole ? 0 : 1))
        {
            return start;
        }

        if (end < text.Length && text[end] is 'e' or 'E')
        {
            int exponent = end + 1 < text.Length && text[end + 1] is '+' or '-' ? end + 2 : end + 1;
            int exponentEnd = EndOfDigits(text, exponent);
            end = exponentEnd > exponent ? exponentEnd : end;
        }

        return end;
    }

    /// <summary>The number that <see cref="EndOfNumber"/> has found; infinite when it is too large for a double.</summary>
    internal static double Parse(ReadOnlySpan<char> number) => double.Parse(number, NumberStyles.Float, CultureInfo.InvariantCulture);

    /// <summary>Whether any digit before the exponent differs from zero; the number may still have underflowed to zero.</summary>
    internal static bool SaysNonzero(ReadOnlySpan<char> number)
    {
        int exponent = number.IndexOfAny('e', 'E');
        return (exponent < 0 ? number : number[..exponent]).ContainsAnyInRange('1', '9');
    }

    /// <summary>The shortest number that in this unit gives exactly this coherent value; the nearest where none does.</summary>
    /// <remarks>
    /// Conversion rounds, so dividing alone may miss the number that was written by a unit or two in the last place. Only for a scale
    /// that is no power of ten can a value lie between two that can be written.
    /// </remarks>
    internal static string Exact(double coherent, Unit unit)
    {
        double nearest = unit.FromCoherent(coherent);
        if (nearest == 0)
        {
            return "0";
        }

        string best = "";
        double candidate = Math.BitDecrement(Math.BitDecrement(nearest));
        for (int step = 0; step < 5; step++, candidate = Math.BitIncrement(candidate))
        {
            string text = Shortest(candidate);
            if (unit.ToCoherent(candidate) == coherent && (best.Length == 0 || text.Length < best.Length))
            {
                best = text;
            }
        }

        return best.Length > 0 ? best : Shortest(nearest);
    }

    /// <summary>The shortest text that reads back as this double.</summary>
    internal static string Shortest(double number) => number.ToString("R", CultureInfo.InvariantCulture);

    /// <summary>
    /// A number for people: 4 significant digits at most, trailing zeros dropped; powers of ten (ISO 80000-1) only below 0.0001 and
    /// from ten million. <c>∞</c> for infinity, <c>NaN</c> for what is not a number.
    /// </summary>
    internal static string Rounded(double number)
    {
        if (!double.IsFinite(number))
        {
            return double.IsNaN(number) ? "NaN" : number > 0 ? "∞" : "-∞";
        }

        Span<char> buffer = stackalloc char[16];
        _ = Math.Abs(number).TryFormat(buffer, out int written, "E3", CultureInfo.InvariantCulture);
        int exponent = int.Parse(buffer[6..written], NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        buffer[1] = buffer[0];
        ReadOnlySpan<char> digits = ((ReadOnlySpan<char>)buffer[1..5]).TrimEnd('0');
        string sign = number < 0 ? "-" : "";
        return digits.Length == 0 ? "0" : exponent is >= -4 and < 7
            ? $"{sign}{Plain(digits, exponent)}"
            : $"{sign}{Pointed(digits, 1)}×10{UnitNotation.Superscript(exponent)}";
    }

    private static string Plain(ReadOnlySpan<char> digits, int exponent) =>
        exponent < 0
            ? $"0.{new string('0', -1 - exponent)}{digits}"
            : Pointed(digits, exponent + 1);

    private static string Pointed(ReadOnlySpan<char> digits, int whole) =>
        digits.Length > whole
            ? $"{digits[..whole]}.{digits[whole..]}"
            : $"{digits}{new string('0', whole - digits.Length)}";

    private static int EndOfDigits(ReadOnlySpan<char> text, int start)
    {
        int end = start;
        while (end < text.Length && char.IsAsciiDigit(text[end]))
        {
            end++;
        }

        return end;
    }
}
