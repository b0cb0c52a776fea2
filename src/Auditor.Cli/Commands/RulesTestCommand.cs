using System.CommandLine;
using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Engine.RuleTests;

namespace Auditor.Cli.Commands;

/// <summary><c>rules test</c>: runs the cases that stand in sheets and rules.</summary>
internal static class RulesTestCommand
{
    public static Command Make(Terminal terminal)
    {
        var rules = RuleSetOption.Make();
        var mutate = new Option<bool>("--mutate")
        {
            Description = "Turn comparisons round, shift limits by 1 %, drop conditions, and list every change that no case notices.",
        };
        var command = new ExampleCommand(
            "test", "Run every case of every sheet and rule.",
            "auditor rules test",
            "auditor rules test --rules house/firm.set.yaml --mutate",
            "auditor rules test --mutate") { rules, mutate };
        command.SetAction(parsed => Run(terminal, parsed.GetValue(rules), parsed.GetValue(mutate)));
        return command;
    }

    private static int Run(Terminal terminal, string? name, bool mutate)
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
        if (problems.HasErrors)
        {
            return ExitCode.Problems;
        }

        return failed > 0 ? ExitCode.Found : mutate ? Mutate(terminal, set) : ExitCode.Clean;
    }

    private static int Mutate(Terminal terminal, RuleSet set)
    {
        var report = new MutationRunner(set).Run();
        var survivors = new Problems();
        foreach (var mutation in report.Survivors)
        {
            survivors.Add(mutation.Unnoticed());
        }

        if (report.Survivors.Count > 0)
        {
            terminal.Output.WriteLine(ProblemText.Render(survivors.All));
        }

        terminal.Output.WriteLine($"{report.Count} changes tried, {report.Survivors.Count} noticed by no case");
        return report.Survivors.Count == 0 ? ExitCode.Clean : ExitCode.Found;
    }
}
