using Auditor.Engine.RuleSets;

namespace Auditor.Cli;

/// <summary>What comes with the program.</summary>
internal static class Shipped
{
    /// <summary>The rule set that an audit uses when neither the design nor the caller names one.</summary>
    public const string DefaultSet = "united-kingdom";

    /// <summary>The shipped rule data.</summary>
    public static RuleHome Rules { get; } = new(Path.Combine(AppContext.BaseDirectory, "rules"), "rules");
}
