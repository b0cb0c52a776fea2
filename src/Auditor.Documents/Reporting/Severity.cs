namespace Auditor.Documents;

/// <summary>How grave a problem is.</summary>
public enum Severity
{
    /// <summary>The work cannot go on to a trustworthy result.</summary>
    Error,

    /// <summary>The work goes on, but someone should look.</summary>
    Warning,
}
