using Auditor.Quantities;

namespace Auditor.Engine.Findings;

/// <summary>The unit of a distance: that of the value, but for temperatures, whose distance is in kelvin.</summary>
public static class MarginUnit
{
    private static readonly Unit Kelvin = UnitCatalog.Find("K")!;

    /// <summary>The unit of a distance between two values in a unit.</summary>
    public static Unit Of(Unit unit) => unit.Dimension.IsTemperature ? Kelvin : unit;
}
