using System.Collections.Frozen;

namespace Auditor.Quantities;

/// <summary>The units the program knows, found by spelling, identifier or dimension.</summary>
public static class UnitCatalog
{
    private const int LongestCompound = 128;

    private static readonly FrozenDictionary<string, Unit> BySpelling = UnitDefinitions.All
        .SelectMany(unit => unit.Spellings, (unit, spelling) => KeyValuePair.Create(spelling, unit))
        .ToFrozenDictionary();

    private static readonly FrozenDictionary<string, Unit>.AlternateLookup<ReadOnlySpan<char>> BySpan =
        BySpelling.GetAlternateLookup<ReadOnlySpan<char>>();

    private static readonly FrozenDictionary<Dimension, Unit[]> ByDimension = UnitDefinitions.All
        .GroupBy(unit => unit.Dimension)
        .ToFrozenDictionary(group => group.Key, group => group.ToArray());

    /// <summary>The catalogued units; those of one dimension in the order in which to name them.</summary>
    public static IReadOnlyList<Unit> All { get; } = UnitDefinitions.All.AsReadOnly();

    /// <summary>The catalogued units of one dimension, the coherent one first; empty when there is none.</summary>
    public static IReadOnlyList<Unit> Of(Dimension dimension) => ByDimension.GetValueOrDefault(dimension, []);

    /// <summary>
    /// The unit so spelled, or null when it is none: a catalogued spelling, or a compound of catalogued units (<c>kW/h</c>,
    /// <c>Ω·mm²/m</c>, <c>A·√s/mm²</c>, <c>m^-1</c>) with exponents up to 9½ in steps of one half and free
    /// space about the signs. °C stands in no compound: K does.
    /// </summary>
    public static Unit? Find(string spelling) => Find(spelling.AsSpan());

    /// <summary>
    /// The unit that an ASCII identifier names in a formula, or null when it names none: a catalogued identifier (<c>mm2</c>,
    /// <c>ohm</c>, <c>percent</c>), or a compound such as <c>ohm_mm2_per_m</c>, <c>rt_s</c>, <c>per_s</c>.
    /// </summary>
    public static Unit? FindIdentifier(string identifier) => UnitIdentifier.IsIdentifier(identifier) ? Find(identifier) : null;

    internal static Unit? Find(ReadOnlySpan<char> spelling)
    {
        if (Catalogued(spelling) is { } unit)
        {
            return unit;
        }

        if (spelling.Length > LongestCompound)
        {
            return null;
        }

        return UnitIdentifier.IsIdentifier(spelling) ? UnitIdentifier.Read(spelling) : UnitExpression.Read(spelling);
    }

    /// <summary>The catalogued units with a spelling that differs in nothing but capital and small letters.</summary>
    internal static IReadOnlyList<Unit> Alike(ReadOnlySpan<char> spelling)
    {
        var alike = new List<Unit>();
        foreach (Unit unit in All)
        {
            foreach (string known in unit.Spellings)
            {
                if (spelling.Equals(known, StringComparison.OrdinalIgnoreCase) && !alike.Contains(unit))
                {
                    alike.Add(unit);
                }
            }
        }

        return alike;
    }

    internal static Unit? Catalogued(ReadOnlySpan<char> spelling) => BySpan.TryGetValue(spelling, out Unit? unit) ? unit : null;
}
