namespace Auditor.Documents;

/// <summary>The limits of a number.</summary>
/// <param name="Least">The least that is taken.</param>
/// <param name="Above">What it has to be above.</param>
/// <param name="Most">The most that is taken.</param>
/// <param name="Below">What it has to be below.</param>
internal sealed record QuickLimits(double Least, double Above, double Most, double Below)
{
    public static readonly QuickLimits None = new(double.NegativeInfinity, double.NegativeInfinity, double.PositiveInfinity, double.PositiveInfinity);

    public bool Take(double value) => value >= Least && value > Above && value <= Most && value < Below;
}
