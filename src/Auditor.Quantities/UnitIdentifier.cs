namespace Auditor.Quantities;

/// <summary>
/// Reads a compound unit written as an identifier: words joined by <c>_</c>, a whole exponent straight after its unit, <c>rt</c> before a
/// unit under a square root, <c>per</c> before all divisors: <c>ohm_mm2_per_m</c>, <c>A_rt_s_per_mm2</c>, <c>per_s</c>.
/// </summary>
internal static class UnitIdentifier
{
    internal static bool IsIdentifier(ReadOnlySpan<char> text)
    {
        foreach (char mark in text)
        {
            if (!char.IsAsciiLetterOrDigit(mark) && mark != '_')
            {
                return false;
            }
        }

        return text.Length > 0 && !char.IsAsciiDigit(text[0]);
    }

    internal static Unit? Read(ReadOnlySpan<char> text)
    {
        var product = new UnitProduct();
        (int sign, bool root, bool complete) = (1, false, false);
        foreach (Range range in text.Split('_'))
        {
            ReadOnlySpan<char> word = text[range];
            if (word is "per" && sign > 0 && !root)
            {
                (sign, complete) = (-1, false);
            }
            else if (word is "rt" && !root)
            {
                (root, complete) = (true, false);
            }
            else if (Factor(word) is { } factor)
            {
                product.Multiply(factor.Unit, sign * (root ? factor.Exponent : 2 * factor.Exponent));
                (root, complete) = (false, true);
            }
            else
            {
                return null;
            }
        }

        return complete ? product.ToUnit() : null;
    }

    /// <summary>A unit and the digits after it; 19 is the square root's share of the largest exponent, 9 and a half.</summary>
    private static (Unit Unit, int Exponent)? Factor(ReadOnlySpan<char> word)
    {
        ReadOnlySpan<char> name = word.TrimEnd("0123456789");
        ReadOnlySpan<char> digits = word[name.Length..];
        int exponent = digits.Length switch
        {
            0 => 1,
            1 or 2 => int.Parse(digits),
            _ => 0,
        };
        Unit? unit = UnitCatalog.Catalogued(name);
        return unit is not null && exponent > 0 && UnitProduct.IsFactor(unit) ? (unit, exponent) : null;
    }
}
