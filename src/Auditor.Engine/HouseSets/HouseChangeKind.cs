namespace Auditor.Engine.HouseSets;

/// <summary>What a house set changes in the sets that it is built on.</summary>
public enum HouseChangeKind
{
    /// <summary>The value of a parameter.</summary>
    Parameter,

    /// <summary>Whether a rule is a requirement or a recommendation.</summary>
    Provision,

    /// <summary>Whether a rule allows departures.</summary>
    Departures,

    /// <summary>A whole rule, dropped or replaced.</summary>
    Rule,

    /// <summary>Figures of a table.</summary>
    Table,

    /// <summary>A time-current curve.</summary>
    Curve,

    /// <summary>The formula of a quantity.</summary>
    Quantity,

    /// <summary>The edition that the figures are said to be of.</summary>
    Edition,
}
