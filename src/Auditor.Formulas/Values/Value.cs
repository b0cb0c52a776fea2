namespace Auditor.Formulas.Values;

/// <summary>
/// What a formula gave: a number in coherent units, a text, a flag, a list of words, or missing with its reasons.
/// The dimension of a number is known to the formula, not to the value.
/// </summary>
public readonly struct Value
{
    private static readonly Absence NoFiniteResult =
        new(AbsenceKind.NotFinite, "", "result", "the calculation has no finite result (a division by zero, a root of a negative or an overflow)", "");

    private readonly object? _reference;

    private Value(ValueKind kind, double number, object? reference, Marks marks)
    {
        Kind = kind;
        Number = number;
        _reference = reference;
        Marks = marks;
    }

    /// <summary>What is held.</summary>
    public ValueKind Kind { get; }

    /// <summary>What it rests on.</summary>
    public Marks Marks { get; }

    /// <summary>The number of a quantity, in coherent units (a temperature in °C).</summary>
    public double Number { get; }

    /// <summary>Whether nothing is held.</summary>
    public bool IsMissing => Kind == ValueKind.Missing;

    /// <summary>The text of a text value.</summary>
    public string Text => (string)_reference!;

    /// <summary>The flag of a flag value.</summary>
    public bool Flag => Number != 0;

    /// <summary>The words of a list value.</summary>
    public IReadOnlyList<string> Words => (IReadOnlyList<string>)_reference!;

    /// <summary>Why nothing is held.</summary>
    public Absences Absences => (Absences)_reference!;

    /// <summary>Whether this is a flag that is true.</summary>
    public bool IsTrue => Kind == ValueKind.Flag && Number != 0;

    /// <summary>Whether this is a flag that is false.</summary>
    public bool IsFalse => Kind == ValueKind.Flag && Number == 0;

    /// <summary>A quantity; missing when the number is not finite, so that no comparison can ever be decided on it.</summary>
    public static Value Of(double number, Marks marks = Marks.None) =>
        double.IsFinite(number) ? new(ValueKind.Quantity, number, null, marks) : Missing(NoFiniteResult, marks);

    /// <summary>A text.</summary>
    public static Value Of(string text, Marks marks = Marks.None) => new(ValueKind.Text, 0, text, marks);

    /// <summary>A flag.</summary>
    public static Value Of(bool flag, Marks marks = Marks.None) => new(ValueKind.Flag, flag ? 1 : 0, null, marks);

    /// <summary>A list of words.</summary>
    public static Value Of(IReadOnlyList<string> words, Marks marks = Marks.None) => new(ValueKind.Words, 0, words, marks);

    /// <summary>Missing for one reason.</summary>
    public static Value Missing(Absence absence, Marks marks = Marks.None) => new(ValueKind.Missing, 0, Values.Absences.Of(absence), marks);

    /// <summary>Missing for the given reasons.</summary>
    public static Value Missing(Absences absences, Marks marks = Marks.None) => new(ValueKind.Missing, 0, absences, marks);

    /// <summary>Missing because one or both of two operands are; at least one must be.</summary>
    public static Value MissingFrom(in Value left, in Value right)
    {
        var marks = left.Marks | right.Marks;
        if (!left.IsMissing)
        {
            return Missing(right.Absences, marks);
        }

        return Missing(right.IsMissing ? left.Absences.And(right.Absences) : left.Absences, marks);
    }

    /// <summary>The same value with further marks.</summary>
    public Value With(Marks marks) => (Marks | marks) == Marks ? this : new(Kind, Number, _reference, Marks | marks);
}
