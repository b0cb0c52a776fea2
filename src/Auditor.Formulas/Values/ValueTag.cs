namespace Auditor.Formulas.Values;

/// <summary>Says of a number that it is one, or a flag, and what it rests on. There is one tag for each kind and each set of marks.</summary>
internal sealed class ValueTag
{
    private const int SetsOfMarks = 4;

    private static readonly ValueTag[] Quantities = Make(ValueKind.Quantity);
    private static readonly ValueTag[] Flags = Make(ValueKind.Flag);

    private ValueTag(ValueKind kind, Marks marks)
    {
        Kind = kind;
        Marks = marks;
    }

    public ValueKind Kind { get; }

    public Marks Marks { get; }

    public static ValueTag OfQuantity(Marks marks) => Quantities[(int)marks];

    public static ValueTag OfFlag(Marks marks) => Flags[(int)marks];

    public ValueTag With(Marks marks) => (Kind == ValueKind.Flag ? Flags : Quantities)[(int)(Marks | marks)];

    private static ValueTag[] Make(ValueKind kind) => [.. Enumerable.Range(0, SetsOfMarks).Select(marks => new ValueTag(kind, (Marks)marks))];
}
