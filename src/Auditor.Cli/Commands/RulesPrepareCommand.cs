using System.CommandLine;
using Auditor.Engine.RuleSets;

namespace Auditor.Cli.Commands;

/// <summary><c>rules prepare</c>: writes the shipped rule files in the form that loads fastest. The build runs it.</summary>
internal static class RulesPrepareCommand
{
    public static Command Make(Terminal terminal)
    {
        var command = new ExampleCommand("prepare", "Write the shipped rule files in the form that loads fastest, beside them; done by the build.", "auditor rules prepare");
        command.SetAction(_ => Run(terminal));
        return command;
    }

    private static int Run(Terminal terminal)
    {
        try
        {
            terminal.Output.WriteLine($"prepared {PreparedRules.Write(Shipped.Rules)} rule files");
            return ExitCode.Clean;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            terminal.Error.WriteLine("the prepared form cannot be written beside the rule files: the folder of the program has to be writable");
            return ExitCode.Problems;
        }
    }
}
