using System.Diagnostics.CodeAnalysis;

namespace Auditor.Quantities;

/// <summary>Quantities as text: reading what files state, writing it back, and showing results to people.</summary>
/// <remarks>
/// A quantity is a number, its unit, then optionally a tolerance, then optionally a comma and a standing:
/// <c>25 m</c>, <c>0.28 Ω ± 10 %</c>, <c>18 m +3 m -1 m</c>, <c>0.32 ohm ± 10 %, assumed</c>. Plus-minus may be typed <c>+-</c> or
/// <c>+/-</c>. A number without a unit is a pure number. Space between the parts is free; a number and its unit need none.
/// </remarks>
public static class QuantityText
{
    /// <summary>
    /// Reads a quantity in one pass. Never throws: a text that is none gives a <see cref="QuantityFault"/>. Numbers above 1e15, and below
    /// 1e-15 but not zero, as written or in coherent units, are faults; so are temperatures below absolute zero.
    /// </summary>
    public static bool TryParse(
        string text,
        [NotNullWhen(true)] out StatedQuantity? value,
        [NotNullWhen(false)] out QuantityFault? fault)
    {
        var reader = new QuantityReader(text);
        value = reader.Read();
        fault = reader.Fault;
        return value is not null;
    }

    /// <summary>
    /// Writes a quantity so that <see cref="TryParse"/> gives back what it was read from, to the last bit. A quantity that was worked out
    /// comes back within a unit in the last place.
    /// </summary>
    public static string Write(StatedQuantity stated)
    {
        string text = WithUnit(NumberText.Exact(stated.Quantity.Value, stated.Unit), stated.Unit);
        if (stated.Tolerance is { } tolerance)
        {
            text = $"{text} {Write(tolerance, stated.Unit)}";
        }

        return StandingWords.Of(stated.Standing) is { } word ? $"{text}, {word}" : text;
    }

    /// <summary>
    /// A coherent value for people, in a unit: <c>1.37 Ω</c>, <c>5 %</c>, <c>30 °C</c>; no unit for a pure number.
    /// See <see cref="ShowNumber"/>.
    /// </summary>
    public static string Show(double coherent, Unit unit) => WithUnit(ShowNumber(coherent, unit), unit);

    /// <summary>
    /// The number of <see cref="Show"/>, for columns that name the unit in their head: at most 4 significant digits, trailing zeros
    /// dropped, <c>0.2196</c>; powers of ten (<c>1.5×10⁷</c>) below 0.0001 and from ten million only.
    /// </summary>
    public static string ShowNumber(double coherent, Unit unit) => NumberText.Rounded(unit.FromCoherent(coherent));

    private static string Write(Tolerance tolerance, Unit unit)
    {
        Unit own = tolerance.Written?.Unit ?? Tolerance.UnitFor(unit);
        string below = tolerance.Written is { } written
            ? NumberText.Shortest(written.Below)
            : NumberText.Exact(tolerance.Below, own);
        string above = tolerance.Written is { } same
            ? NumberText.Shortest(same.Above)
            : NumberText.Exact(tolerance.Above, own);
        return below == above ? $"± {WithUnit(below, own)}" : $"+{WithUnit(above, own)} -{WithUnit(below, own)}";
    }

    private static string WithUnit(string number, Unit unit) => unit.Equals(Unit.One) ? number : $"{number} {unit}";
}
