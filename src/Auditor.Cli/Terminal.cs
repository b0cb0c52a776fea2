using Auditor.Documents;
using Spectre.Console;

namespace Auditor.Cli;

/// <summary>Where a command writes: results to the output, problems to the error stream.</summary>
/// <param name="output">Results.</param>
/// <param name="error">Problems and diagnostics.</param>
/// <param name="noColour">Whether the caller wants no colours.</param>
internal sealed class Terminal(TextWriter output, TextWriter error, bool noColour)
{
    private const int RedirectedWidth = 120;

    /// <summary>Results.</summary>
    public TextWriter Output { get; } = output;

    /// <summary>Problems and diagnostics.</summary>
    public TextWriter Error { get; } = error;

    /// <summary>The output as a console: colours only on a terminal that wants them, a fixed width elsewhere.</summary>
    public IAnsiConsole Console()
    {
        var isTerminal = ReferenceEquals(Output, System.Console.Out) && !System.Console.IsOutputRedirected;
        var wantsColour = isTerminal && !noColour && string.IsNullOrEmpty(Environment.GetEnvironmentVariable("NO_COLOR"));
        var console = AnsiConsole.Create(new AnsiConsoleSettings
        {
            Ansi = wantsColour ? AnsiSupport.Detect : AnsiSupport.No,
            ColorSystem = wantsColour ? ColorSystemSupport.Detect : ColorSystemSupport.NoColors,
            Interactive = InteractionSupport.No,
            Out = new AnsiConsoleOutput(Output),
        });
        if (!isTerminal)
        {
            console.Profile.Width = RedirectedWidth;
        }

        return console;
    }

    /// <summary>Writes problems to the error stream.</summary>
    /// <returns>Whether any of them is an error.</returns>
    public bool Tell(Problems problems)
    {
        var all = problems.All;
        if (all.Count > 0)
        {
            Error.WriteLine(ProblemText.Render(all));
            var errors = all.Count(problem => problem.Severity == Severity.Error);
            Error.WriteLine(errors == 1 ? "1 problem" : $"{errors} problems");
        }

        return problems.HasErrors;
    }
}
