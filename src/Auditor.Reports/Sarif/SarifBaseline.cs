namespace Auditor.Reports.Sarif;

/// <summary>How a result stands against an earlier audit (SARIF 2.1.0, 3.27.24).</summary>
public enum SarifBaseline
{
    /// <summary>It was not there before.</summary>
    New,

    /// <summary>It was there before, as it is now.</summary>
    Unchanged,

    /// <summary>It was there before, with another value, limit or message.</summary>
    Updated,
}
