namespace Auditor.Formulas.Tables;

/// <summary>How far a figure may be trusted, from the best.</summary>
public enum Trust
{
    /// <summary>Two independent publications were read.</summary>
    TwoSources,

    /// <summary>One publication was read.</summary>
    OneSource,

    /// <summary>Computed from other figures.</summary>
    Derived,

    /// <summary>Held by the trade without a source of its own.</summary>
    CommonPractice,

    /// <summary>From memory, and it agrees with an independent figure.</summary>
    MemoryCrossChecked,

    /// <summary>From memory.</summary>
    Memory,
}
