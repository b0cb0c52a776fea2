using System.Text;

namespace Auditor.Quantities;

/// <summary>
/// How a product of powers is written. Exponents come doubled, so that one half is 1. Products take a half-high dot and quotients
/// a solidus (ISO 80000-1, SI brochure 5.3); each divisor has a solidus of its own, as the trade writes mV/A/m.
/// </summary>
internal static class UnitNotation
{
    /// <summary>The superscript digits, in order.</summary>
    internal const string Superscripts = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    /// <summary><c>A·s^½/mm²</c>; <c>1</c> for an empty product.</summary>
    internal static string Symbol(ReadOnlySpan<(string Name, int Doubled)> factors)
    {
        var text = new StringBuilder();
        foreach ((string name, int doubled) in factors)
        {
            if (doubled > 0)
            {
                text.Append(text.Length > 0 ? "·" : "").Append(name).Append(Exponent(doubled));
            }
        }

        text.Append(text.Length == 0 ? "1" : "");
        foreach ((string name, int doubled) in factors)
        {
            if (doubled < 0)
            {
                text.Append('/').Append(name).Append(Exponent(-doubled));
            }
        }

        return text.ToString();
    }

    /// <summary>
    /// <c>A_rt_s_per_mm2</c>: factors joined by <c>_</c>, <c>rt_</c> before a square root, all divisors after one <c>per_</c>.
    /// </summary>
    internal static string Identifier(ReadOnlySpan<(string Name, int Doubled)> factors)
    {
        var words = new List<string>();
        foreach ((string name, int doubled) in factors)
        {
            if (doubled > 0)
            {
                words.Add(Word(name, doubled));
            }
        }

        int multipliers = words.Count;
        foreach ((string name, int doubled) in factors)
        {
            if (doubled < 0)
            {
                words.Add(Word(name, -doubled));
            }
        }

        if (words.Count > multipliers)
        {
            words.Insert(multipliers, "per");
        }

        return string.Join('_', words);
    }

    /// <summary>A whole number in superscript digits, with a superscript minus where it is negative.</summary>
    internal static string Superscript(int number)
    {
        var text = new StringBuilder();
        foreach (char digit in number.ToString())
        {
            text.Append(digit == '-' ? '⁻' : Superscripts[digit - '0']);
        }

        return text.ToString();
    }

    private static string Exponent(int doubled) => doubled switch
    {
        1 => "^½",
        2 => "",
        _ when doubled % 2 == 0 => Superscript(doubled / 2),
        _ => $"^{doubled / 2}.5",
    };

    private static string Word(string name, int doubled) => doubled switch
    {
        1 => $"rt_{name}",
        2 => name,
        _ when doubled % 2 == 0 => $"{name}{doubled / 2}",
        _ => $"rt_{name}{doubled}",
    };
}
