namespace Auditor.Rules.Tests.Precise;

/// <summary>Comparison as rules compare: a number within one part in 10⁹ of a limit is at it.</summary>
internal static class Slack
{
    public static bool Same(DoubleDouble a, DoubleDouble b)
    {
        var greater = a.Abs() < b.Abs() ? b.Abs() : a.Abs();
        return !((a - b).Abs() > greater * 1e-9);
    }

    public static bool AtLeast(DoubleDouble a, DoubleDouble b) => a > b || Same(a, b);
}
