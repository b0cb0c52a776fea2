namespace Auditor.Fuzz.Tests;

/// <summary>What became of an input.</summary>
internal enum Judgement
{
    /// <summary>It has neither a result nor a problem that can be shown, which no input may have.</summary>
    Neither,

    /// <summary>It has a result.</summary>
    Taken,

    /// <summary>It has problems, in words that can be shown.</summary>
    Refused,
}
