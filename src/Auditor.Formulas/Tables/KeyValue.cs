namespace Auditor.Formulas.Tables;

/// <summary>
/// One key value of a table, a word or a number. Numbers are held to 40 binary digits (12 decimal ones), so that
/// a size that went through a unit conversion still finds its row.
/// </summary>
internal readonly record struct KeyValue
{
    private const long Half = 1L << 11;

    private KeyValue(string? word, double number)
    {
        Word = word;
        Number = number;
    }

    public string? Word { get; }

    public double Number { get; }

    public static KeyValue Of(string word) => new(word, 0);

    public static KeyValue Of(double number) =>
        new(null, BitConverter.Int64BitsToDouble((BitConverter.DoubleToInt64Bits(number) + Half) & ~((Half << 1) - 1)));
}
