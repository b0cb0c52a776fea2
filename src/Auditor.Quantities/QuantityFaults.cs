namespace Auditor.Quantities;

/// <summary>The wording of every fault of a quantity text.</summary>
internal static class QuantityFaults
{
    internal static QuantityFault NumberMissing(int start, int length) =>
        new(start, length, "a quantity begins with a number", "write for example `25 m`");

    internal static QuantityFault UnitUnknown(int start, string unit) =>
        new(start, unit.Length, $"`{unit}` is not a unit", "write for example `mm²`, `Ω`, `kA` or `mΩ/m`");
}
