namespace Auditor.Quantities;

/// <summary>
/// Reads a compound unit as people write it: <c>kW/h</c>, <c>Ω·mm²/m</c>, <c>A·√s/mm²</c>, <c>m^-1</c>, <c>1/s</c>. A product sign is
/// <c>·</c> or <c>*</c>. No product sign may follow a solidus, because readers disagree on its meaning (ISO 80000-1): <c>mV/A/m</c> it is.
/// </summary>
internal ref struct UnitExpression
{
    private readonly ReadOnlySpan<char> _text;
    private int _at;

    private UnitExpression(ReadOnlySpan<char> text) => _text = text;

    private readonly char Next => _at < _text.Length ? _text[_at] : '\0';

    internal static Unit? Read(ReadOnlySpan<char> text) => new UnitExpression(text).Product();

    private static int SuperscriptDigit(char mark) => UnitNotation.Superscripts.IndexOf(mark);

    private static int AsciiDigit(char mark) => char.IsAsciiDigit(mark) ? mark - '0' : -1;

    private static bool EndsName(char mark) =>
        mark is '/' or '·' or '\u22C5' or '*' or '^' or '√' or '½' or '⁻'
        || char.IsWhiteSpace(mark) || char.IsDigit(mark) || SuperscriptDigit(mark) >= 0;

    private Unit? Product()
    {
        var product = new UnitProduct();
        bool dividing = false;
        if (Next == '1')
        {
            _at++;
            SkipSpace();
            dividing = Take('/');
            if (!dividing)
            {
                return null;
            }
        }

        while (true)
        {
            SkipSpace();
            if (Factor() is not { } factor)
            {
                return null;
            }

            product.Multiply(factor.Unit, dividing ? -factor.Doubled : factor.Doubled);
            SkipSpace();
            if (_at == _text.Length)
            {
                return product.ToUnit();
            }

            bool multiplying = Take('·') || Take('\u22C5') || Take('*');
            if (dividing ? !Take('/') : !multiplying && !Take('/'))
            {
                return null;
            }

            dividing = !multiplying;
        }
    }

    private (Unit Unit, int Doubled)? Factor()
    {
        bool root = Take('√');
        int start = _at;
        while (_at < _text.Length && !EndsName(_text[_at]))
        {
            _at++;
        }

        Unit? unit = UnitCatalog.Catalogued(_text[start.._at]);
        int doubled = root ? 1 : Exponent();
        return unit is not null && doubled != 0 && UnitProduct.IsFactor(unit) ? (unit, doubled) : null;
    }

    /// <summary>Twice the exponent, 2 where none is written, 0 where it is not an exponent.</summary>
    private int Exponent()
    {
        if (Take('^'))
        {
            int sign = Take('-') || Take('\u2212') ? -1 : 1;
            return Take('½') ? sign : sign * Halves(Digits(AsciiDigit));
        }

        if (Next == '⁻' || SuperscriptDigit(Next) >= 0)
        {
            int sign = Take('⁻') ? -1 : 1;
            return sign * 2 * (Digits(SuperscriptDigit) ?? 0);
        }

        return char.IsAsciiDigit(Next) ? 2 * (Digits(AsciiDigit) ?? 0) : 2;
    }

    private int Halves(int? whole)
    {
        bool fraction = Take('.');
        return whole is null || (fraction && !Take('5')) ? 0 : (2 * whole.Value) + (fraction ? 1 : 0);
    }

    /// <summary>A whole number in digits of one kind, or null where there is none in range.</summary>
    private int? Digits(Func<char, int> digitOf)
    {
        int? number = null;
        for (; digitOf(Next) >= 0 && number is null or <= UnitProduct.LargestExponent; _at++)
        {
            number = (10 * (number ?? 0)) + digitOf(Next);
        }

        return number <= UnitProduct.LargestExponent ? number : null;
    }

    private void SkipSpace()
    {
        while (char.IsWhiteSpace(Next))
        {
            _at++;
        }
    }

    private bool Take(char mark)
    {
        bool taken = Next == mark;
        _at += taken ? 1 : 0;
        return taken;
    }
}
