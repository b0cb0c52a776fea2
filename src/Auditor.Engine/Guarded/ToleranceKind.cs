namespace Auditor.Engine.Guarded;

/// <summary>Where a tolerance comes from.</summary>
public enum ToleranceKind
{
    /// <summary>The design states it. Every value within it is taken to be as likely as any other (JCGM 101 6.4.2).</summary>
    Stated,

    /// <summary>
    /// It is the operating uncertainty of an instrument, with the coverage factor 2 (IEC 61557-1): the true value is distributed normally,
    /// with half of it as standard deviation.
    /// </summary>
    Instrument,
}
