using System.CommandLine;
using Auditor.Documents;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli.Commands;

/// <summary>The option that names a rule set.</summary>
internal static class RuleSetOption
{
    public static Option<string?> Make() => new("--rules")
    {
        Description = "Rule set: the name of a shipped one, or the path of a set file.",
        HelpName = "SET",
    };

    /// <summary>Loads the named set, or the default one.</summary>
    public static RuleSet? Load(string? name, Problems problems) =>
        RuleSetLoader.Load(Shipped.Rules, name ?? Shipped.DefaultSet, Environment.CurrentDirectory, null, problems);
}
