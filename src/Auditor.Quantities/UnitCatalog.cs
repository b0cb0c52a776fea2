using System.Collections.Frozen;

namespace Auditor.Quantities;

/// <summary>The units the program knows, found by spelling, identifier or dimension.</summary>
public static class UnitCatalog
{
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

    /// <summary>The unit so spelled, or null when it is none.</summary>
    public static Unit? Find(string spelling) => Find(spelling.AsSpan());

    /// <summary>The unit that an ASCII identifier names in a formula (<c>mm2</c>, <c>mohm_per_m</c>), or null when it is none.</summary>
    public static Unit? FindIdentifier(string identifier) =>
        BySpelling.TryGetValue(identifier, out Unit? unit) ? unit : null;

    internal static Unit? Find(ReadOnlySpan<char> spelling) => BySpan.TryGetValue(spelling, out Unit? unit) ? unit : null;
}
