using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli;

/// <summary>What comes with the program.</summary>
internal static class Shipped
{
    /// <summary>The rule set that an audit uses when neither the design nor the caller names one.</summary>
    public const string DefaultSet = "united-kingdom";

    /// <summary>The shipped rule data.</summary>
    public static RuleHome Rules { get; } = new(Path.Combine(AppContext.BaseDirectory, "rules"), "rules");

    /// <summary>Reads the shipped schema of design files.</summary>
    public static DesignSchema DesignSchema() =>
        Engine.Installation.DesignSchema.Parse(new SourceText($"{Rules.Display}/schema/design.schema.json", File.ReadAllText(Rules.SchemaPath("design"))));
}
