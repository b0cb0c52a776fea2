namespace Auditor.Rules.Tests;

/// <summary>How the figures of a lookup go with one of its numeric keys, all others held.</summary>
internal enum Course
{
    /// <summary>They never fall.</summary>
    Rises,

    /// <summary>They never rise.</summary>
    Falls,

    /// <summary>Nothing forces either.</summary>
    Free,
}
