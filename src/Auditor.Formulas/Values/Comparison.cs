namespace Auditor.Formulas.Values;

/// <summary>
/// The one place that decides whether a number keeps a limit. Numbers are compared at full precision, never rounded,
/// with a relative slack of 1e-9: a value at its limit keeps it, whatever the last bits of the arithmetic say.
/// </summary>
public static class Comparison
{
    /// <summary>The relative slack.</summary>
    public const double Slack = 1e-9;

    /// <summary>Whether two numbers are the same within the slack.</summary>
    public static bool Same(double a, double b) => Math.Abs(a - b) <= Slack * Math.Max(Math.Abs(a), Math.Abs(b));

    /// <summary>Whether <paramref name="value"/> is at most <paramref name="limit"/>.</summary>
    public static bool AtMost(double value, double limit) => value <= limit || Same(value, limit);

    /// <summary>Whether <paramref name="value"/> is at least <paramref name="limit"/>.</summary>
    public static bool AtLeast(double value, double limit) => value >= limit || Same(value, limit);
}
