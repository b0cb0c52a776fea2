using System.Runtime.InteropServices;
using Auditor.Engine.Findings;

namespace Auditor.Engine.Guarded;

/// <summary>
/// How well a judgement comes out, for comparing judgements of one rule: nonconforming before undetermined before conforming before
/// not applicable, and among equals by margin.
/// </summary>
/// <param name="Standing">Place of the verdict, the worst first.</param>
/// <param name="Margin">The relative margin, or the absolute one for a limit of zero; 0 where nothing is measured.</param>
[StructLayout(LayoutKind.Auto)]
internal readonly record struct Score(int Standing, double Margin) : IComparable<Score>
{
    /// <summary>Place of a nonconformity.</summary>
    public const int Fails = 0;

    /// <summary>Place of what cannot be told.</summary>
    public const int Unknown = 1;

    /// <summary>Place of what conforms.</summary>
    public const int Conforms = 2;

    /// <summary>Place of a rule that does not apply.</summary>
    public const int Absent = 3;

    /// <summary>Differences below this share of a margin of one are the last bits of the arithmetic.</summary>
    private const double Noise = 1e-12;

    public static Score Of(Judgement judgement)
    {
        var margin = judgement.Margin is { } known ? known.Relative ?? known.Absolute : 0;
        return judgement.Verdict switch
        {
            Verdict.Nonconforming => new Score(Fails, margin),
            Verdict.Undetermined => new Score(Unknown, 0),
            null => new Score(Absent, 0),
            _ => new Score(Conforms, margin),
        };
    }

    /// <summary>Whether nothing tells two judgements apart.</summary>
    public bool Equals(Score other) => CompareTo(other) == 0;

    /// <inheritdoc/>
    public override int GetHashCode() => Standing;

    public static bool operator <(Score left, Score right) => left.CompareTo(right) < 0;

    public static bool operator >(Score left, Score right) => left.CompareTo(right) > 0;

    public static bool operator <=(Score left, Score right) => left.CompareTo(right) <= 0;

    public static bool operator >=(Score left, Score right) => left.CompareTo(right) >= 0;

    public int CompareTo(Score other)
    {
        if (Standing != other.Standing)
        {
            return Standing.CompareTo(other.Standing);
        }

        return Math.Abs(Margin - other.Margin) <= Noise * Math.Max(1, Math.Abs(Margin)) ? 0 : Margin.CompareTo(other.Margin);
    }
}
