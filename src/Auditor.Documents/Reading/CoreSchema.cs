using System.Globalization;

namespace Auditor.Documents;

/// <summary>What an unquoted scalar is by the YAML 1.2 core schema (YAML 1.2.2, section 10.3.2), but that <c>.inf</c> and <c>.nan</c> are texts.</summary>
internal static class CoreSchema
{
    public static ScalarKind Resolve(string text, out double number)
    {
        number = 0;
        return text switch
        {
            "" or "~" or "null" or "Null" or "NULL" => ScalarKind.Null,
            "true" or "True" or "TRUE" or "false" or "False" or "FALSE" => ScalarKind.Flag,
            _ => TryNumber(text, out number) ? ScalarKind.Number : ScalarKind.Text,
        };
    }

    private static bool TryNumber(string text, out double number)
    {
        number = 0;
        if (text[0] is not (>= '0' and <= '9' or '+' or '-' or '.'))
        {
            return false;
        }

        if (text.StartsWith("0x", StringComparison.Ordinal))
        {
            return TryDigits(text, "0123456789abcdef", out number);
        }

        return text.StartsWith("0o", StringComparison.Ordinal)
            ? TryDigits(text, "01234567", out number)
            : IsDecimalNumber(text) && double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out number) && double.IsFinite(number);
    }

    private static bool TryDigits(string text, string digits, out double number)
    {
        number = 0;
        foreach (var c in text.AsSpan(2))
        {
            var digit = digits.IndexOf(char.ToLowerInvariant(c));
            if (digit < 0)
            {
                return false;
            }

            number = (number * digits.Length) + digit;
        }

        return text.Length > 2 && double.IsFinite(number);
    }

    /// <summary>Whether a text is a sign, digits with a point anywhere among or beside them, and an exponent; all but digits may be left out.</summary>
    private static bool IsDecimalNumber(ReadOnlySpan<char> text)
    {
        var at = text[0] is '+' or '-' ? 1 : 0;
        var whole = Digits(text, ref at);
        var decimals = 0;
        if (at < text.Length && text[at] == '.')
        {
            at++;
            decimals = Digits(text, ref at);
        }

        return whole + decimals > 0 && (at == text.Length || IsExponent(text[at..]));
    }

    private static bool IsExponent(ReadOnlySpan<char> text)
    {
        if (text[0] is not ('e' or 'E'))
        {
            return false;
        }

        var at = text.Length > 1 && text[1] is '+' or '-' ? 2 : 1;
        return Digits(text, ref at) > 0 && at == text.Length;
    }

    private static int Digits(ReadOnlySpan<char> text, ref int at)
    {
        var start = at;
        while (at < text.Length && char.IsAsciiDigit(text[at]))
        {
            at++;
        }

        return at - start;
    }
}
