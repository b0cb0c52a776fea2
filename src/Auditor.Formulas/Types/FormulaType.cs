using Auditor.Quantities;

namespace Auditor.Formulas.Types;

/// <summary>
/// The static type of a formula: its kind, the dimension of a quantity, and the words that an input may take.
/// </summary>
/// <remarks>Two types are equal when kind and dimension are; the vocabulary only serves to catch misspelt words.</remarks>
public sealed class FormulaType : IEquatable<FormulaType>
{
    private FormulaType(FormulaKind kind, Dimension dimension, IReadOnlyList<string>? vocabulary)
    {
        Kind = kind;
        Dimension = dimension;
        Vocabulary = vocabulary;
    }

    /// <summary>A pure number.</summary>
    public static FormulaType Number { get; } = new(FormulaKind.Quantity, Dimension.None, null);

    /// <summary>Free text.</summary>
    public static FormulaType Text { get; } = new(FormulaKind.Text, Dimension.None, null);

    /// <summary>True or false.</summary>
    public static FormulaType Flag { get; } = new(FormulaKind.Flag, Dimension.None, null);

    /// <summary>A list of words.</summary>
    public static FormulaType Words { get; } = new(FormulaKind.Words, Dimension.None, null);

    /// <summary>A group of inputs.</summary>
    public static FormulaType Group { get; } = new(FormulaKind.Group, Dimension.None, null);

    /// <summary>The kind.</summary>
    public FormulaKind Kind { get; }

    /// <summary>Dimension of a quantity; <see cref="Dimension.None"/> for every other kind.</summary>
    public Dimension Dimension { get; }

    /// <summary>The words that a text or a list may hold; null where any text may stand.</summary>
    public IReadOnlyList<string>? Vocabulary { get; }

    /// <summary>A quantity of the given dimension.</summary>
    public static FormulaType Of(Dimension dimension) => new(FormulaKind.Quantity, dimension, null);

    /// <summary>A text that is one of the given words.</summary>
    public static FormulaType OneOf(IReadOnlyList<string> words) => new(FormulaKind.Text, Dimension.None, words);

    /// <summary>A list whose items are among the given words.</summary>
    public static FormulaType WordsOf(IReadOnlyList<string> words) => new(FormulaKind.Words, Dimension.None, words);

    /// <inheritdoc/>
    public bool Equals(FormulaType? other) => other is not null && Kind == other.Kind && Dimension == other.Dimension;

    /// <inheritdoc/>
    public override bool Equals(object? obj) => Equals(obj as FormulaType);

    /// <inheritdoc/>
    public override int GetHashCode() => HashCode.Combine(Kind, Dimension);

    /// <summary>The type in words, for messages.</summary>
    public override string ToString() => Kind switch
    {
        FormulaKind.Quantity when Dimension.IsNone => "a pure number",
        FormulaKind.Quantity => "a quantity in " + UnitWord(),
        FormulaKind.Text => "a text",
        FormulaKind.Flag => "true or false",
        FormulaKind.Words => "a list of words",
        _ => "a group of inputs",
    };

    private string UnitWord()
    {
        var units = UnitCatalog.Of(Dimension);
        foreach (var unit in units)
        {
            if (unit.Scale == 1)
            {
                return unit.Symbol;
            }
        }

        return Dimension.ToString();
    }
}
