using System.CommandLine;
using Auditor.Documents;

namespace Auditor.Cli.Commands;

/// <summary><c>rules check</c>: reads a rule set and tells everything that is wrong with its files.</summary>
internal static class RulesCheckCommand
{
    public static Command Make(Terminal terminal)
    {
        var rules = RuleSetOption.Make();
        var command = new ExampleCommand(
            "check", "Check every file of a rule set: schema, names, units, tables, circles.",
            "auditor rules check",
            "auditor rules check --rules house/firm.set.yaml") { rules };
        command.SetAction(parsed => Run(terminal, parsed.GetValue(rules)));
        return command;
    }

    private static int Run(Terminal terminal, string? name)
    {
        var problems = new Problems();
        var set = RuleSetOption.Load(name, problems);
        if (terminal.Tell(problems) || set is null)
        {
            return ExitCode.Problems;
        }

        terminal.Output.WriteLine(
            $"{set.Title.Id}: {set.Files.Count} files, {set.World.Lookups.Count} lookups, {set.World.Curves.All.Count} curves, {set.Parameters.Count} parameters, " +
            $"{set.Quantities.Count()} quantities, {set.Rules.Count} rules, {set.Pictures.Count} pictures: no problems");
        return ExitCode.Clean;
    }
}
