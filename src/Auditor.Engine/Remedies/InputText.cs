using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.Remedies;

/// <summary>Writes the value of an input as a design file states it.</summary>
public static class InputText
{
    /// <summary>
    /// The text of a value. A tolerance of the earlier text stays; its standing does not, for the new value is one of design.
    /// </summary>
    /// <param name="value">The value.</param>
    /// <param name="slot">The input.</param>
    /// <param name="earlier">What the design states, whose unit and tolerance are kept; empty for nothing.</param>
    public static string Of(in Value value, InputSlot slot, string earlier)
    {
        switch (value.Kind)
        {
            case ValueKind.Text:
                return value.Text;
            case ValueKind.Flag:
                return value.Flag ? "true" : "false";
            case ValueKind.Words:
                return $"[{string.Join(", ", value.Words)}]";
            default:
                return Quantity(value.Number, slot, earlier);
        }
    }

    private static string Quantity(double number, InputSlot slot, string earlier)
    {
        var isGiven = QuantityText.TryParse(earlier, out var stated, out _) && stated.Quantity.Dimension == slot.Type.Dimension;
        var unit = isGiven ? stated!.Unit : slot.Unit ?? Unit.One;
        var quantity = new Quantity(number, slot.Type.Dimension);
        var tolerance = isGiven && stated!.Tolerance is { Written: { } written } ? Tolerance.Of(written.Below, written.Above, written.Unit, quantity) : null;
        return QuantityText.Write(new StatedQuantity(quantity, unit, tolerance, Quantities.Standing.Designed));
    }
}
