namespace Auditor.Reports.Pictures.Margins;

/// <summary>
/// The axis of relative margins: stretched about zero by the inverse hyperbolic sine, so that what is tight can be told apart while what is
/// far from its limit still has a place. Margins beyond its ends stand at the ends.
/// </summary>
internal sealed class MarginScale
{
    /// <summary>Below this share the axis is nearly even, above it nearly logarithmic.</summary>
    private const double Even = 0.1;

    private static readonly double[] Marks = [-10, -5, -2, -1, -0.5, -0.2, -0.1, -0.05, 0, 0.05, 0.1, 0.2, 0.5, 1, 2, 5, 10];

    private readonly double _left;
    private readonly double _right;
    private readonly double _from;
    private readonly double _to;

    /// <summary>Makes the axis for some margins.</summary>
    /// <param name="margins">Relative margins; at least one.</param>
    /// <param name="left">Where it begins in the drawing.</param>
    /// <param name="right">Where it ends.</param>
    public MarginScale(IReadOnlyCollection<double> margins, double left, double right)
    {
        _left = left;
        _right = right;
        _from = Marks.LastOrDefault(mark => mark <= Math.Min(margins.Min(), -0.2), Marks[0]);
        _to = Marks.FirstOrDefault(mark => mark >= Math.Max(margins.Max(), 1), Marks[^1]);
    }

    /// <summary>The marks of the axis.</summary>
    public IEnumerable<double> Ticks => Marks.Where(mark => mark >= _from && mark <= _to);

    /// <summary>Place of a margin.</summary>
    public double Of(double margin) =>
        _left + ((_right - _left) * (Stretch(Math.Clamp(margin, _from, _to)) - Stretch(_from)) / (Stretch(_to) - Stretch(_from)));

    private static double Stretch(double margin) => Math.Asinh(margin / Even);
}
