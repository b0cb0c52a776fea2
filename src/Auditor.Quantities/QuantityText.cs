using System.Diagnostics.CodeAnalysis;
using System.Globalization;

namespace Auditor.Quantities;

/// <summary>Quantities as text: reading what files state, writing it back, and showing results to people.</summary>
public static class QuantityText
{
    /// <summary>Reads a quantity: a number, its unit, and optionally a tolerance and a standing. Never throws.</summary>
    public static bool TryParse(
        string text,
        [NotNullWhen(true)] out StatedQuantity? value,
        [NotNullWhen(false)] out QuantityFault? fault)
    {
        (value, fault) = (null, null);
        int end = 0;
        while (end < text.Length && (char.IsAsciiDigit(text[end]) || text[end] is '.' or '-'))
        {
            end++;
        }

        if (!double.TryParse(text.AsSpan(0, end), NumberStyles.Float, CultureInfo.InvariantCulture, out double number))
        {
            fault = QuantityFaults.NumberMissing(0, end);
            return false;
        }

        string spelling = text[end..].Trim();
        Unit? unit = spelling.Length == 0 ? Unit.One : UnitCatalog.Find(spelling);
        if (unit is null)
        {
            fault = QuantityFaults.UnitUnknown(text.IndexOf(spelling, end, StringComparison.Ordinal), spelling);
            return false;
        }

        value = new StatedQuantity(Quantity.Of(number, unit), unit, Tolerance: null, Standing.Designed);
        return true;
    }

    /// <summary>Writes a quantity so that <see cref="TryParse"/> gives it back exactly.</summary>
    public static string Write(StatedQuantity stated) => $"{stated.Quantity.In(stated.Unit):R} {stated.Unit}";

    /// <summary>A value for people: at most 4 significant digits and the unit, <c>1.37 Ω</c>.</summary>
    public static string Show(double coherent, Unit unit) => $"{ShowNumber(coherent, unit)} {unit}";

    /// <summary>The number of <see cref="Show"/> without the unit, for columns that name it in their head.</summary>
    public static string ShowNumber(double coherent, Unit unit) => unit.FromCoherent(coherent).ToString("G4");
}
