namespace Auditor.Limits.Tests.Properties;

/// <summary>Comparison of figures of two designs, with the slack that the order of arithmetic explains.</summary>
internal static class Order
{
    private const double Same = 1e-12;

    /// <summary>Fails when a figure is smaller than it was. One that is missing now or was so before tells nothing.</summary>
    public static void NeverFalls(double? before, double? after, string where) => Check(before, after, where, "fell");

    /// <summary>Fails when a figure is greater than it was.</summary>
    public static void NeverRises(double? before, double? after, string where) => Check(-before, -after, where, "rose");

    private static void Check(double? before, double? after, string where, string what)
    {
        if (before is { } from && after is { } to)
        {
            Assert.True(to >= from - (Same * Math.Max(Math.Abs(from), Math.Abs(to))), $"{where} {what} from {Math.Abs(from):R} to {Math.Abs(to):R}");
        }
    }
}
