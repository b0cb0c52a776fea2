namespace Auditor.Quantities;

/// <summary>A quantity as a file states it.</summary>
/// <param name="Quantity">The value in coherent units, with its dimension.</param>
/// <param name="Unit">The unit it was written in; <see cref="Unit.One"/> for a bare number.</param>
/// <param name="Tolerance">How far the true value may lie off, or null where nothing is said.</param>
/// <param name="Standing">How the value came to be known.</param>
public sealed record StatedQuantity(Quantity Quantity, Unit Unit, Tolerance? Tolerance, Standing Standing)
{
    /// <summary>The quantity as <see cref="QuantityText"/> writes it.</summary>
    public override string ToString() => QuantityText.Write(this);
}
