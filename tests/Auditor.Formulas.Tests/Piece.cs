namespace Auditor.Formulas.Tests;

/// <summary>A random formula, or a part of one.</summary>
/// <param name="Text">Its text.</param>
/// <param name="Level">How loosely it holds together: 0 for a name, number or call, 1 for a power or sign, 2 for a product, 3 for a sum, more for all else.</param>
/// <param name="Parts">Where its parts stand in the text, itself the first, none with the brackets around it.</param>
/// <param name="Value">Its value by what it was made of, with plain doubles: a <see cref="double"/>, a <see cref="bool"/>, or null where it is missing.</param>
internal sealed record Piece(string Text, int Level, IReadOnlyList<(int Start, int Length)> Parts, Func<IReadOnlyDictionary<string, double>, object?> Value)
{
    public const int Loosest = 9;

    public static Piece Of(int level, Func<IReadOnlyDictionary<string, double>, object?> value, params object[] bits)
    {
        var text = string.Concat(bits.Select(bit => bit is Piece piece ? piece.Text : (string)bit));
        var parts = new List<(int, int)> { (0, text.Length) };
        var at = 0;
        foreach (var bit in bits)
        {
            if (bit is Piece piece)
            {
                parts.AddRange(piece.Parts.Select(part => (at + part.Start, part.Length)));
            }

            at += bit is Piece inner ? inner.Text.Length : ((string)bit).Length;
        }

        return new Piece(text, level, parts, value);
    }

    /// <summary>A part whose value only the program works out.</summary>
    public static Piece Opaque(int level, params object[] bits) => Of(level, _ => throw new NotSupportedException(), bits);

    /// <summary>The piece in brackets where it holds together more loosely than its surroundings allow.</summary>
    public Piece Within(int level)
    {
        if (Level <= level)
        {
            return this;
        }

        var bracketed = Of(0, Value, "(", this, ")");
        return bracketed with { Parts = [.. bracketed.Parts.Skip(1)] };
    }
}
