using System.CommandLine;
using Auditor.Cli.Starting;
using Auditor.Documents;

namespace Auditor.Cli.Commands;

/// <summary><c>new</c>: writes a small commented design file to start from.</summary>
internal static class NewCommand
{
    public static Command Make(Terminal terminal)
    {
        var name = new Argument<string>("NAME") { Description = "Name of the job; the file is called NAME.design.yaml, in the folder that NAME names." };
        var phases = new Option<int>("--phases") { Description = "Number of phases of the supply: 1 or 3.", DefaultValueFactory = _ => 1, HelpName = "NUMBER" };
        var command = new Command("new", """
            Write a small commented design file to start from.

            Examples:
              auditor new garden-office
              auditor new jobs/workshop --phases 3
            """) { name, phases };
        command.SetAction(parsed => Run(terminal, parsed.GetValue(name)!, parsed.GetValue(phases)));
        return command;
    }

    private static int Run(Terminal terminal, string name, int phases)
    {
        var problems = new Problems();
        var path = name.EndsWith(DesignPaths.Ending, StringComparison.Ordinal) ? name : name + DesignPaths.Ending;
        if (StartingDesign.Text(phases, Path.GetFileName(path)[..^DesignPaths.Ending.Length]) is not { } text)
        {
            problems.Add(StartMessages.UnknownPhases(phases));
        }
        else if (NewFile.Write(path, text, problems))
        {
            terminal.Output.WriteLine($"Wrote {path}. Next: auditor audit {path}");
        }

        return terminal.Tell(problems) ? ExitCode.Problems : ExitCode.Clean;
    }
}
