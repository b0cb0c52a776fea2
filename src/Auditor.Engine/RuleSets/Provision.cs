namespace Auditor.Engine.RuleSets;

/// <summary>What kind of statement a rule makes (ISO/IEC Directives, Part 2).</summary>
public enum Provision
{
    /// <summary>"Shall": what the standard demands.</summary>
    Requirement,

    /// <summary>"Should": what is advised.</summary>
    Recommendation,
}
