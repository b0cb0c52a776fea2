using System.Runtime.CompilerServices;
using Auditor.Formulas.Subjects;

namespace Auditor.Formulas.Values;

/// <summary>
/// What a formula gave: a number in coherent units, a text, a flag, a list of words, or missing with its reasons.
/// The dimension of a number is known to the formula, not to the value.
/// </summary>
/// <remarks>
/// Two words wide, so that it is passed in registers. An input that is not given is told by its subject and slot alone; the reason is put
/// into words when somebody asks for it, which for most inputs nobody does.
/// </remarks>
public readonly struct Value
{
    private const int BitsOfMarks = 8;

    /// <summary>A flag that is true, as a number 1.</summary>
    private static readonly long One = BitConverter.DoubleToInt64Bits(1);

    private static readonly Absence NoFiniteResult =
        new(AbsenceKind.NotFinite, "", "result", "the calculation has no finite result (a division by zero, a root of a negative or an overflow)", "");

    /// <summary>A tag for a number or a flag; else the text, the words, the absences, or the subject that does not give an input.</summary>
    private readonly object? _held;

    /// <summary>With a tag the number; else the marks, and above them the slot of an input that is not given.</summary>
    private readonly long _bits;

    private Value(object held, long bits)
    {
        _held = held;
        _bits = bits;
    }

    /// <summary>What is held.</summary>
    public ValueKind Kind => _held switch
    {
        ValueTag tag => tag.Kind,
        string => ValueKind.Text,
        WordList => ValueKind.Words,
        _ => ValueKind.Missing,
    };

    /// <summary>What it rests on.</summary>
    public Marks Marks => _held is ValueTag tag ? tag.Marks : (Marks)(byte)_bits;

    /// <summary>The number of a quantity, in coherent units (a temperature in °C); 1 or 0 of a flag, 0 of anything else.</summary>
    public double Number => _held is ValueTag ? BitConverter.Int64BitsToDouble(_bits) : 0;

    /// <summary>Whether nothing is held.</summary>
    public bool IsMissing => _held is not (ValueTag or string or WordList);

    /// <summary>Whether this is no result at all, not even a missing one: the value of a place into which none was put.</summary>
    public bool IsBlank => _held is null;

    /// <summary>The text of a text value.</summary>
    public string Text => (string)_held!;

    /// <summary>The flag of a flag value; false of anything else, lest something that is missing pass for true.</summary>
    public bool Flag => IsTrue;

    /// <summary>The words of a list value.</summary>
    public IReadOnlyList<string> Words => ((WordList)_held!).Items;

    /// <summary>Why nothing is held.</summary>
    public Absences Absences => _held as Absences ?? new Absences(OwnGap);

    /// <summary>Whether this is a flag that is true.</summary>
    public bool IsTrue => _held is ValueTag { Kind: ValueKind.Flag } && _bits != 0;

    /// <summary>Whether this is a flag that is false.</summary>
    public bool IsFalse => _held is ValueTag { Kind: ValueKind.Flag } && _bits == 0;

    /// <summary>The input that is not given, where that alone is missing.</summary>
    private Gap OwnGap => new(_held!, (int)(_bits >> BitsOfMarks));

    /// <summary>A quantity; missing when the number is not finite, so that no comparison can ever be decided on it.</summary>
    public static Value Of(double number, Marks marks = Marks.None) =>
        double.IsFinite(number) ? new(ValueTag.OfQuantity(marks), BitConverter.DoubleToInt64Bits(number)) : Missing(NoFiniteResult, marks);

    /// <summary>A text.</summary>
    public static Value Of(string text, Marks marks = Marks.None) => new(text, (long)marks);

    /// <summary>A flag.</summary>
    public static Value Of(bool flag, Marks marks = Marks.None) => new(ValueTag.OfFlag(marks), flag ? One : 0);

    /// <summary>A list of words.</summary>
    public static Value Of(IReadOnlyList<string> words, Marks marks = Marks.None) => new(new WordList(words), (long)marks);

    /// <summary>Missing for one reason.</summary>
    public static Value Missing(Absence absence, Marks marks = Marks.None) => Missing(Absences.Of(absence), marks);

    /// <summary>Missing for the given reasons.</summary>
    public static Value Missing(Absences absences, Marks marks = Marks.None) => new(absences, (long)marks);

    /// <summary>Missing because a subject does not give an input.</summary>
    /// <param name="subject">The subject.</param>
    /// <param name="slot">Slot number of the input.</param>
    public static Value NotGiven(ISubject subject, int slot) => new(subject, (long)slot << BitsOfMarks);

    /// <summary>Missing because one or both of two operands are; at least one must be.</summary>
    public static Value MissingFrom(in Value left, in Value right)
    {
        if (!left.IsMissing)
        {
            return right.With(left.Marks);
        }

        if (!right.IsMissing || (ReferenceEquals(left._held, right._held) && left._bits >> BitsOfMarks == right._bits >> BitsOfMarks))
        {
            return left.With(right.Marks);
        }

        var (one, other) = (left.OwnGap, right.OwnGap);
        var joined = Absences.Joined(
            left._held is Absences first ? first.Gaps : new ReadOnlySpan<Gap>(in one),
            right._held is Absences second ? second.Gaps : new ReadOnlySpan<Gap>(in other));
        return joined is null ? left.With(right.Marks) : Missing(joined, left.Marks | right.Marks);
    }

    /// <summary>Takes the value of a place that other threads may fill meanwhile: the whole of it, or a blank where there is none yet.</summary>
    public static Value Take(ref readonly Value place)
    {
        var held = Volatile.Read(ref Unsafe.AsRef(in place._held));
        return held is null ? default : new(held, place._bits);
    }

    /// <summary>
    /// Puts a value into a blank place where other threads may look, or put the same value. The number goes before the tag: who sees
    /// that something is there sees all of it.
    /// </summary>
    public static void Put(ref Value place, in Value value)
    {
        Unsafe.AsRef(in place._bits) = value._bits;
        Volatile.Write(ref Unsafe.AsRef(in place._held), value._held);
    }

    /// <summary>The same value with further marks.</summary>
    public Value With(Marks marks)
    {
        var own = Marks;
        if ((own | marks) == own)
        {
            return this;
        }

        return _held is ValueTag tag ? new(tag.With(marks), _bits) : new(_held!, _bits | (long)marks);
    }
}
