using System.CommandLine;
using System.CommandLine.Help;
using System.CommandLine.Invocation;

namespace Auditor.Cli.Commands;

/// <summary>The usual help of a command, followed by its examples.</summary>
/// <param name="usual">The usual help.</param>
internal sealed class HelpWithExamples(HelpAction usual) : SynchronousCommandLineAction
{
    /// <summary>Adds examples to the help of all commands below a root.</summary>
    public static void AddTo(RootCommand root)
    {
        foreach (var option in root.Options.OfType<HelpOption>())
        {
            option.Action = new HelpWithExamples((HelpAction)option.Action!);
        }
    }

    /// <inheritdoc/>
    public override int Invoke(ParseResult parseResult)
    {
        var code = usual.Invoke(parseResult);
        if (parseResult.CommandResult.Command is ExampleCommand command)
        {
            var output = parseResult.InvocationConfiguration.Output;
            output.WriteLine("Examples:");
            foreach (var example in command.Examples)
            {
                output.WriteLine("  " + example);
            }
        }

        return code;
    }
}
