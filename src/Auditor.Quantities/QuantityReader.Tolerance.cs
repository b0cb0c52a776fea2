using System.Diagnostics.CodeAnalysis;

namespace Auditor.Quantities;

internal ref partial struct QuantityReader
{
    private bool ReadTolerance(Unit unit, Quantity quantity, out Tolerance? tolerance)
    {
        tolerance = null;
        if (AtEnd || Next == ',')
        {
            return true;
        }

        int start = _at;
        if (TakePlusMinus())
        {
            if (!ReadSide(unit, out double both, out Unit? bothUnit))
            {
                return false;
            }

            tolerance = Tolerance.Of(both, both, bothUnit, quantity);
        }
        else if (!ReadSides(unit, quantity, out tolerance))
        {
            return false;
        }

        if (Math.Max(tolerance.Below, tolerance.Above) > Largest)
        {
            Fault = QuantityFaults.TooLarge(start, _text[start.._at].TrimEnd().Length);
        }

        return Fault is null;
    }

    private bool ReadSides(Unit unit, Quantity quantity, [NotNullWhen(true)] out Tolerance? tolerance)
    {
        tolerance = null;
        bool aboveFirst = !IsMinus(Next);
        _at++;
        if (!ReadSide(unit, out double first, out Unit? firstUnit))
        {
            return false;
        }

        if (aboveFirst ? !IsMinus(Next) : Next != '+')
        {
            Fault = QuantityFaults.ToleranceSideMissing(_at, aboveFirst ? '-' : '+');
            return false;
        }

        _at++;
        int start = _at;
        if (!ReadSide(unit, out double second, out Unit? secondUnit))
        {
            return false;
        }

        if (!firstUnit.Equals(secondUnit))
        {
            Fault = QuantityFaults.ToleranceUnitsDiffer(start, _at - start, firstUnit, secondUnit);
            return false;
        }

        tolerance = aboveFirst
            ? Tolerance.Of(second, first, firstUnit, quantity)
            : Tolerance.Of(first, second, firstUnit, quantity);
        return true;
    }

    /// <summary>Reads the number and unit of one side of a tolerance, after its sign.</summary>
    private bool ReadSide(Unit valueUnit, out double number, [NotNullWhen(true)] out Unit? unit)
    {
        SkipSpace();
        unit = null;
        if (!ReadDigits(out number))
        {
            Fault ??= QuantityFaults.ToleranceNumberMissing(_at, WordAt(_at));
            return false;
        }

        int start = _at;
        SkipSpace();
        int unitStart = _at;
        if (!ReadUnit(out unit))
        {
            return false;
        }

        if (!Tolerance.Suits(unit, valueUnit.Dimension))
        {
            int length = _text[unitStart.._at].TrimEnd().Length;
            Fault = length == 0 ? QuantityFaults.ToleranceUnitMissing(start, valueUnit)
                : valueUnit.Equals(Unit.One) ? QuantityFaults.ValueUnitMissing(unitStart, length, unit)
                : valueUnit.Dimension.IsTemperature ? QuantityFaults.ToleranceOfTemperature(unitStart, length, unit)
                : QuantityFaults.ToleranceUnitUnfit(unitStart, length, unit, valueUnit);
        }

        return Fault is null;
    }

    private bool TakePlusMinus()
    {
        ReadOnlySpan<char> rest = _text[_at..];
        int length = rest[0] == '±' ? 1
            : rest[0] == '+' && rest.Length > 1 && IsMinus(rest[1]) ? 2
            : rest.StartsWith("+/") && rest.Length > 2 && IsMinus(rest[2]) ? 3
            : 0;
        _at += length;
        return length > 0;
    }
}
