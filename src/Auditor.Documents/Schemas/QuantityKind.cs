using Auditor.Quantities;

namespace Auditor.Documents;

/// <summary>A kind of quantity that a schema can ask for by <c>quantity: &lt;name&gt;</c>.</summary>
/// <param name="Name">The name in the schema.</param>
/// <param name="Noun">What it is called in a sentence, with its article.</param>
/// <param name="Dimension">The dimension that its unit must have.</param>
/// <param name="Example">How one is written.</param>
/// <param name="UnitSymbols">The only units to accept, where the dimension alone does not tell; empty for all of the dimension.</param>
public sealed record QuantityKind(string Name, string Noun, Dimension Dimension, string Example, params IReadOnlyList<string> UnitSymbols)
{
    /// <summary>All kinds.</summary>
    public static IReadOnlyList<QuantityKind> All { get; } =
    [
        new("length", "a length", Dimension.Length, "25 m"),
        new("area", "an area", Dimension.Area, "2.5 mm²"),
        new("current", "a current", Dimension.Current, "32 A"),
        new("voltage", "a voltage", Dimension.Voltage, "230 V"),
        new("resistance", "a resistance", Dimension.Resistance, "0.28 Ω"),
        new("impedance", "an impedance", Dimension.Resistance, "0.35 Ω"),
        new("power", "a power", Dimension.Power, "7.2 kW", "W", "kW", "MW"),
        new("apparent-power", "an apparent power", Dimension.Power, "50 kVA", "VA", "kVA", "MVA"),
        new("time", "a time", Dimension.Time, "0.4 s"),
        new("temperature", "a temperature", Dimension.Temperature, "30 °C"),
        new("temperature-difference", "a temperature difference", Dimension.TemperatureDifference, "40 K"),
        new("frequency", "a frequency", Dimension.Frequency, "50 Hz"),
        new("ratio", "a ratio", Dimension.None, "4.5 %"),
        new("thermal-resistivity", "a thermal resistivity", Dimension.ThermalResistivity, "2.5 K·m/W"),
        new("let-through", "a let-through energy", Dimension.JouleIntegral, "18000 A²s"),
        new("resistance-per-length", "a resistance per length", Dimension.ResistancePerLength, "7.41 mΩ/m"),
    ];

    /// <summary>The units to name to people.</summary>
    public IReadOnlyList<string> AcceptedUnits => UnitSymbols.Count > 0 ? UnitSymbols : [.. UnitCatalog.Of(Dimension).Select(unit => unit.Symbol)];

    /// <summary>Returns the kind of a name, or null when there is none.</summary>
    public static QuantityKind? Find(string name) => All.FirstOrDefault(kind => kind.Name == name);

    /// <summary>Whether a quantity of this kind may be stated in a unit.</summary>
    public bool Accepts(Unit unit) => unit.Dimension == Dimension && (UnitSymbols.Count == 0 || UnitSymbols.Contains(unit.Symbol, StringComparer.Ordinal));
}
