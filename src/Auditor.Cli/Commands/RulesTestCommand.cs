using System.CommandLine;
using Auditor.Documents;
using Auditor.Engine.RuleTests;

namespace Auditor.Cli.Commands;

/// <summary><c>rules test</c>: runs the cases that stand in sheets and rules.</summary>
internal static class RulesTestCommand
{
    public static Command Make(Terminal terminal)
    {
        var rules = RuleSetOption.Make();
        var command = new Command("test", """
            Run every case of every sheet and rule.

            Examples:
              auditor rules test
              auditor rules test --rules house/firm.set.yaml
            """) { rules };
        command.SetAction(parsed => Run(terminal, parsed.GetValue(rules)));
        return command;
    }

    private static int Run(Terminal terminal, string? name)
    {
        var problems = new Problems();
        var set = RuleSetOption.Load(name, problems);
        if (set is null)
        {
            terminal.Tell(problems);
            return ExitCode.Problems;
        }

        var results = new CaseRunner(set, problems).RunAll();
        terminal.Tell(problems);
        foreach (var result in results.Where(result => result.Failure is not null))
        {
            terminal.Output.WriteLine($"{result.Span}: {result.Owner}, case \"{result.Name}\": {result.Failure}");
        }

        var failed = results.Count(result => result.Failure is not null);
        terminal.Output.WriteLine($"{results.Count - failed} passed, {failed} failed");
        return problems.HasErrors ? ExitCode.Problems : failed == 0 ? ExitCode.Clean : ExitCode.Found;
    }
}
