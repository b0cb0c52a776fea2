namespace Auditor.Quantities;

/// <summary>
/// A unit of measurement: a dimension, a scale to the coherent unit of that dimension, and the ways to write it. Units come from
/// <see cref="UnitCatalog"/>. Units are equal when their symbols are: a symbol is made of catalogued names only, so it settles the rest.
/// </summary>
/// <remarks>
/// Coherent units are V, A, m, s, K and their products; a temperature is coherent in °C, so degree Celsius has scale 1 and no
/// offset is ever applied. Spellings are case-sensitive, as in the SI (m is not M).
/// </remarks>
public sealed class Unit : IEquatable<Unit>
{
    private readonly double _multiplier;
    private readonly double _divisor;

    internal Unit(string symbol, string identifier, Dimension dimension, double multiplier, double divisor, params string[] spellings)
    {
        Symbol = symbol;
        Identifier = identifier;
        Dimension = dimension;
        (_multiplier, _divisor) = Reduced(multiplier, divisor);
        Spellings = [.. spellings.Prepend(identifier).Prepend(symbol).Distinct()];
    }

    /// <summary>The unit of a pure number, which is not written.</summary>
    public static Unit One { get; } = new("1", "one", Dimension.None, 1, 1);

    /// <summary>The preferred spelling, for people: <c>mm²</c>, <c>Ω</c>, <c>mΩ/m</c>, <c>%</c>, <c>°C</c>.</summary>
    public string Symbol { get; }

    /// <summary>The spelling that is an identifier, for formulas: <c>mm2</c>, <c>ohm</c>, <c>mohm_per_m</c>, <c>percent</c>.</summary>
    public string Identifier { get; }

    /// <summary>The dimension of quantities in this unit.</summary>
    public Dimension Dimension { get; }

    /// <summary>A number in this unit times this scale is the number in coherent units.</summary>
    public double Scale => _multiplier / _divisor;

    /// <summary>The catalogued spellings, <see cref="Symbol"/> and <see cref="Identifier"/> among them, the preferred one first.</summary>
    public IReadOnlyList<string> Spellings { get; }

    internal double Multiplier => _multiplier;

    internal double Divisor => _divisor;

    /// <summary>The coherent value of a number written in this unit.</summary>
    public double ToCoherent(double number) => number * _multiplier / _divisor;

    /// <summary>The number in this unit of a coherent value.</summary>
    public double FromCoherent(double coherent) => coherent * _divisor / _multiplier;

    /// <inheritdoc/>
    public bool Equals(Unit? other) => Symbol == other?.Symbol;

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as Unit);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Dimension, Scale);

    /// <summary>The symbol.</summary>
    public override string ToString() => Symbol;

    /// <summary>
    /// The same ratio in lowest terms while both terms are exact whole numbers, so that one multiplication or one division, with one
    /// rounding, is all that a conversion takes: 30 mA is 30/1000 A, which is 0.03 exactly as written.
    /// </summary>
    private static (double Multiplier, double Divisor) Reduced(double multiplier, double divisor)
    {
        const double LargestExact = 9007199254740992;
        if (!double.IsInteger(multiplier) || !double.IsInteger(divisor) || Math.Max(multiplier, divisor) > LargestExact)
        {
            return (multiplier / divisor, 1);
        }

        (double larger, double smaller) = (multiplier, divisor);
        while (smaller > 0)
        {
            (larger, smaller) = (smaller, larger % smaller);
        }

        return (multiplier / larger, divisor / larger);
    }
}
