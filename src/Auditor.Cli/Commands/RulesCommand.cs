using System.CommandLine;

namespace Auditor.Cli.Commands;

/// <summary><c>rules</c>: looks into rule sets and checks them.</summary>
internal static class RulesCommand
{
    public static Command Make(Terminal terminal) => new("rules", "Look into the rule set in force, and check and test rule files.")
    {
        RulesListCommand.Make(terminal),
        RulesShowCommand.Make(terminal),
        RulesCheckCommand.Make(terminal),
        RulesTestCommand.Make(terminal),
        RulesPrepareCommand.Make(terminal),
    };
}
