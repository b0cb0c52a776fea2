using System.Runtime.InteropServices;

namespace Auditor.Rules.Tests.Precise;

/// <summary>
/// A number as the sum of two doubles that do not overlap: about 31 decimal digits in the range of a double. The algorithms for sums and
/// products without error are those of Dekker (Numerische Mathematik 18, 1971) and Knuth (The Art of Computer Programming, volume 2, 4.2.2).
/// </summary>
/// <param name="High">The nearest double.</param>
/// <param name="Low">What it leaves over.</param>
[StructLayout(LayoutKind.Auto)]
internal readonly record struct DoubleDouble(double High, double Low)
{
    private const int Halvings = 9;

    private static readonly DoubleDouble LogOfTwo = new(0.693147180559945286, 2.319046813846299558e-17);

    public static implicit operator DoubleDouble(double number) => new(number, 0);

    public static DoubleDouble operator -(DoubleDouble a) => new(-a.High, -a.Low);

    public static DoubleDouble operator +(DoubleDouble a, DoubleDouble b)
    {
        var high = Sum(a.High, b.High);
        var low = Sum(a.Low, b.Low);
        var once = Joined(high.High, high.Low + low.High);
        return Joined(once.High, once.Low + low.Low);
    }

    public static DoubleDouble operator -(DoubleDouble a, DoubleDouble b) => a + -b;

    public static DoubleDouble operator *(DoubleDouble a, DoubleDouble b)
    {
        var high = a.High * b.High;
        return Joined(high, Math.FusedMultiplyAdd(a.High, b.High, -high) + ((a.High * b.Low) + (a.Low * b.High)));
    }

    public static DoubleDouble operator /(DoubleDouble a, DoubleDouble b)
    {
        var first = a.High / b.High;
        var rest = a - (b * first);
        var second = rest.High / b.High;
        rest -= b * second;
        return Joined(first, second) + (rest.High / b.High);
    }

    public static bool operator <(DoubleDouble a, DoubleDouble b) => a.High < b.High || (a.High == b.High && a.Low < b.Low);

    public static bool operator >(DoubleDouble a, DoubleDouble b) => b < a;

    public bool IsFinite => double.IsFinite(High) && double.IsFinite(Low);

    public DoubleDouble Abs() => High < 0 ? -this : this;

    /// <summary>The square root, by one step of Newton's method from that of a double.</summary>
    public DoubleDouble Sqrt()
    {
        if (High <= 0)
        {
            return Math.Sqrt(High);
        }

        var near = Math.Sqrt(High);
        return near + ((this - ((DoubleDouble)near * near)) / (2 * near));
    }

    /// <summary>The exponential, by its series near nought.</summary>
    public DoubleDouble Exp()
    {
        var doublings = Math.Round(High / LogOfTwo.High);
        var small = (this - (LogOfTwo * doublings)) * Math.ScaleB(1, -Halvings);
        DoubleDouble sum = 1;
        DoubleDouble term = 1;
        for (var i = 1; i <= 14; i++)
        {
            term = term * small / i;
            sum += term;
        }

        for (var i = 0; i < Halvings; i++)
        {
            sum *= sum;
        }

        var scale = Math.ScaleB(1, (int)doublings);
        return new DoubleDouble(sum.High * scale, sum.Low * scale);
    }

    /// <summary>The natural logarithm, by two steps of Newton's method from that of a double.</summary>
    public DoubleDouble Log()
    {
        DoubleDouble near = Math.Log(High);
        near += (this * (-near).Exp()) - 1;
        return near + ((this * (-near).Exp()) - 1);
    }

    /// <summary>A power of a positive number; squares without the logarithm.</summary>
    public DoubleDouble Power(DoubleDouble exponent) => exponent == 2 ? this * this : (Log() * exponent).Exp();

    private static DoubleDouble Sum(double a, double b)
    {
        var sum = a + b;
        var other = sum - a;
        return new DoubleDouble(sum, (a - (sum - other)) + (b - other));
    }

    /// <summary>Of a greater number and a smaller one.</summary>
    private static DoubleDouble Joined(double greater, double smaller)
    {
        var sum = greater + smaller;
        return new DoubleDouble(sum, double.IsFinite(sum) ? smaller - (sum - greater) : 0);
    }
}
