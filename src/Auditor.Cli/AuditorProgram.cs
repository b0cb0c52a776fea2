using System.CommandLine;
using Auditor.Cli.Commands;
using Auditor.Documents;

namespace Auditor.Cli;

/// <summary>The program: takes the command line apart and runs one command.</summary>
internal static class AuditorProgram
{
    /// <summary>Runs a command line.</summary>
    /// <returns>The exit code.</returns>
    public static int Run(string[] args, TextWriter output, TextWriter error)
    {
        if (!Directory.Exists(Shipped.Rules.Folder))
        {
            error.WriteLine("the rule data that belong beside the program are missing; build or install it anew");
            return ExitCode.Problems;
        }

        var noColour = new Option<bool>("--no-color") { Description = "No colours. The variable NO_COLOR does the same.", Recursive = true };
        var verbose = new Option<bool>("--verbose") { Description = "Tell on standard error what the program does.", Recursive = true };
        var terminal = new Terminal(output, error, args.Contains("--no-color"));
        using var log = Logging.Start(args.Contains("--verbose"));
        var root = new RootCommand("Audits low-voltage electrical installations against wiring rules kept as data.")
        {
            AuditCommand.Make(terminal),
            CompareCommand.Make(terminal),
            EvidenceCommand.Make(terminal),
            LimitsCommand.Make(terminal),
            RemediesCommand.Make(terminal),
            RulesCommand.Make(terminal),
            NewCommand.Make(terminal),
            ImportCommand.Make(terminal),
            SchemaCommand.Make(terminal),
            noColour,
            verbose,
        };
        HelpWithExamples.AddTo(root);
        try
        {
            return Run(root, args, output, error);
        }
        catch (LostOutputException lost)
        {
            var problems = new Problems();
            problems.Add(CommandMessages.OutputLost(lost.Message));
            terminal.Tell(problems);
            return ExitCode.Problems;
        }
    }

    private static int Run(RootCommand root, string[] args, TextWriter output, TextWriter error)
    {
        var parsed = root.Parse(args);
        if (parsed.Errors.Count > 0 && parsed.Action is not HelpWithExamples)
        {
            foreach (var fault in parsed.Errors)
            {
                error.WriteLine(fault.Message);
            }

            return ExitCode.Problems;
        }

        return parsed.Invoke(new InvocationConfiguration { Output = output, Error = error, EnableDefaultExceptionHandler = false });
    }
}
