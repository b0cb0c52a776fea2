namespace Auditor.Engine.Comparisons;

/// <summary>The things that a rule set is made of.</summary>
public enum RuleItem
{
    /// <summary>A parameter.</summary>
    Parameter,

    /// <summary>A rule.</summary>
    Rule,

    /// <summary>A quantity of a sheet.</summary>
    Quantity,

    /// <summary>A table function: its keys, and what holds between its rows.</summary>
    Lookup,

    /// <summary>A table of figures.</summary>
    Table,

    /// <summary>A time-current curve.</summary>
    Curve,
}
