using System.Globalization;
using System.Text.RegularExpressions;

namespace Auditor.Documents;

/// <summary>What an unquoted scalar is by the YAML 1.2 core schema (YAML 1.2.2, section 10.3.2), but that <c>.inf</c> and <c>.nan</c> are texts.</summary>
internal static partial class CoreSchema
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
            : DecimalNumber().IsMatch(text) && double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out number) && double.IsFinite(number);
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

    [GeneratedRegex(@"^[-+]?(\.[0-9]+|[0-9]+(\.[0-9]*)?)([eE][-+]?[0-9]+)?\z", RegexOptions.ExplicitCapture | RegexOptions.NonBacktracking)]
    private static partial Regex DecimalNumber();
}
