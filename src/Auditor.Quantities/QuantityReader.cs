using System.Diagnostics.CodeAnalysis;

namespace Auditor.Quantities;

/// <summary>Reads one quantity from left to right, once. The first fault ends the reading.</summary>
internal ref partial struct QuantityReader
{
    private const double Largest = 1e15;
    private const double Smallest = 1e-15;
    private const double AbsoluteZero = -273.15;

    private readonly ReadOnlySpan<char> _text;
    private int _at;

    internal QuantityReader(ReadOnlySpan<char> text) => _text = text;

    /// <summary>The first fault, or null while there is none.</summary>
    internal QuantityFault? Fault { get; private set; }

    private readonly bool AtEnd => _at == _text.Length;

    private readonly char Next => _at < _text.Length ? _text[_at] : '\0';

    internal StatedQuantity? Read()
    {
        SkipSpace();
        if (AtEnd)
        {
            Fault = QuantityFaults.Empty(_at);
            return null;
        }

        int start = _at;
        if (!ReadNumber(out double number) || !ReadUnit(out Unit? unit))
        {
            return null;
        }

        var quantity = Quantity.Of(number, unit);
        if (!CheckValue(quantity, start)
            || !ReadTolerance(unit, quantity, out Tolerance? tolerance)
            || !ReadStanding(out Standing standing))
        {
            return null;
        }

        return new StatedQuantity(quantity, unit, tolerance, standing);
    }

    private static bool IsMinus(char mark) => mark is '-' or '\u2212';

    private bool ReadNumber(out double number)
    {
        int start = _at;
        bool negative = IsMinus(Next);
        if (negative || Next == '+')
        {
            _at++;
            SkipSpace();
        }

        int digits = _at;
        if (!ReadDigits(out number))
        {
            Fault ??= NotANumber(start, digits);
            return false;
        }

        number = negative ? 0 - number : number;
        return true;
    }

    /// <summary>Reads a number without a sign; false with a fault when it is out of range, without one when there is none.</summary>
    private bool ReadDigits(out double number)
    {
        int start = _at;
        _at = NumberText.EndOfNumber(_text, start);
        ReadOnlySpan<char> digits = _text[start.._at];
        number = digits.IsEmpty ? 0 : NumberText.Parse(digits);
        if (digits.IsEmpty)
        {
            return false;
        }

        if (Next == ',' && _at + 1 < _text.Length && char.IsAsciiDigit(_text[_at + 1]))
        {
            Fault = QuantityFaults.CommaInNumber(_at, 1);
        }
        else if (number > Largest)
        {
            Fault = QuantityFaults.TooLarge(start, digits.Length);
        }
        else if (number < Smallest && NumberText.SaysNonzero(digits))
        {
            Fault = QuantityFaults.TooSmall(start, digits.Length);
        }

        return Fault is null;
    }

    private readonly QuantityFault NotANumber(int start, int digits)
    {
        ReadOnlySpan<char> word = WordAt(start);
        ReadOnlySpan<char> bare = _text[digits..].TrimStart('.');
        bool named = bare.StartsWith("nan", StringComparison.OrdinalIgnoreCase)
            || bare.StartsWith("inf", StringComparison.OrdinalIgnoreCase)
            || bare.StartsWith("∞", StringComparison.Ordinal);
        return named ? QuantityFaults.NotFinite(start, word) : QuantityFaults.NumberMissing(start, word);
    }

    /// <summary>Reads a unit up to a tolerance, a comma or the end; <see cref="Unit.One"/> where none is written.</summary>
    private bool ReadUnit([NotNullWhen(true)] out Unit? unit)
    {
        SkipSpace();
        int start = _at;
        while (!AtEnd && Next is not ('±' or '+' or ',') && !(IsMinus(Next) && (_at == start || _text[_at - 1] != '^')))
        {
            _at++;
        }

        ReadOnlySpan<char> spelling = _text[start.._at].TrimEnd();
        if (spelling.IsEmpty)
        {
            unit = Unit.One;
            return true;
        }

        if (char.IsAsciiDigit(spelling[0]) && !spelling[1..].TrimStart().StartsWith('/'))
        {
            Fault = QuantityFaults.SecondNumber(start, spelling);
            unit = null;
            return false;
        }

        unit = UnitCatalog.Find(spelling);
        if (unit is null)
        {
            Fault = QuantityFaults.UnitUnknown(start, spelling, UnitCatalog.Alike(spelling));
        }

        return unit is not null;
    }

    private bool CheckValue(Quantity quantity, int start)
    {
        double size = Math.Abs(quantity.Value);
        int length = _text[start.._at].TrimEnd().Length;
        if (size > Largest)
        {
            Fault = QuantityFaults.TooLarge(start, length);
        }
        else if (size is > 0 and < Smallest)
        {
            Fault = QuantityFaults.TooSmall(start, length);
        }
        else if (quantity.Dimension.IsTemperature && quantity.Value < AbsoluteZero)
        {
            Fault = QuantityFaults.BelowAbsoluteZero(start, length);
        }

        return Fault is null;
    }

    private bool ReadStanding(out Standing standing)
    {
        standing = Standing.Designed;
        if (AtEnd)
        {
            return true;
        }

        if (Next != ',')
        {
            Fault = QuantityFaults.Surplus(_at, _text[_at..].TrimEnd());
            return false;
        }

        int comma = _at++;
        SkipSpace();
        ReadOnlySpan<char> word = _text[_at..].TrimEnd();
        if (word.IsEmpty)
        {
            Fault = QuantityFaults.StandingMissing(comma + 1);
            return false;
        }

        if (!StandingWords.TryRead(word, out standing))
        {
            Fault = QuantityFaults.StandingUnknown(_at, word);
            return false;
        }

        return true;
    }

    private readonly ReadOnlySpan<char> WordAt(int start)
    {
        int end = start;
        while (end < _text.Length && (end == start || !char.IsWhiteSpace(_text[end])))
        {
            end++;
        }

        return _text[start..end];
    }

    private void SkipSpace()
    {
        while (char.IsWhiteSpace(Next))
        {
            _at++;
        }
    }
}
