namespace Auditor.Engine.Guarded;

/// <summary>In how many of the designs drawn at random from within the tolerances a rule is kept (JCGM 101).</summary>
/// <param name="Samples">How many were drawn.</param>
/// <param name="Kept">In how many of them the rule is kept, or does not apply.</param>
public sealed record SampleShare(int Samples, int Kept)
{
    /// <summary>The share in which the rule is kept.</summary>
    public double Share => (double)Kept / Samples;

    /// <summary>
    /// Standard error of the share: the standard deviation of the share given the count, every share being equally likely beforehand. It is
    /// never zero, also where all samples agree.
    /// </summary>
    public double StandardError
    {
        get
        {
            double kept = Kept + 1;
            double failed = Samples - Kept + 1;
            var all = kept + failed;
            return Math.Sqrt(kept * failed / (all * all * (all + 1)));
        }
    }
}
