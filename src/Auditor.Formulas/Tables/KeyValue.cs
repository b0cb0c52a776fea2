using System.Runtime.InteropServices;

namespace Auditor.Formulas.Tables;

/// <summary>One key value of a table, a word or a number.</summary>
/// <param name="Word">The word; null for a number.</param>
/// <param name="Number">The number in coherent units; 0 for a word.</param>
[StructLayout(LayoutKind.Auto)]
internal readonly record struct KeyValue(string? Word, double Number)
{
    public static KeyValue Of(string word) => new(word, 0);

    public static KeyValue Of(double number) => new(null, number);
}
