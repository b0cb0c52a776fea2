namespace Auditor.Formulas.Values;

/// <summary>The distinct absences that one missing value rests on, in the order in which they were met.</summary>
public sealed class Absences
{
    /// <summary>Beyond this many, further absences of one value are not kept: the list is for a person to act on.</summary>
    public const int Most = 12;

    private readonly Gap[] _gaps;

    internal Absences(Gap gap) => _gaps = [gap];

    private Absences(Gap[] gaps) => _gaps = gaps;

    /// <summary>The absences.</summary>
    public IReadOnlyList<Absence> Items => Array.ConvertAll(_gaps, gap => gap.Absence);

    internal ReadOnlySpan<Gap> Gaps => _gaps;

    /// <summary>One absence.</summary>
    public static Absences Of(Absence absence) => new(new Gap(absence, 0));

    /// <summary>Both lists, each absence once; null where the second adds nothing to the first.</summary>
    internal static Absences? Joined(ReadOnlySpan<Gap> first, ReadOnlySpan<Gap> second)
    {
        Span<int> added = stackalloc int[Most];
        var count = 0;
        for (var i = 0; i < second.Length && first.Length + count < Most; i++)
        {
            if (!first.Contains(second[i]))
            {
                added[count++] = i;
            }
        }

        if (count == 0)
        {
            return null;
        }

        var gaps = new Gap[first.Length + count];
        first.CopyTo(gaps);
        for (var i = 0; i < count; i++)
        {
            gaps[first.Length + i] = second[added[i]];
        }

        return new Absences(gaps);
    }
}
