using Auditor.Documents;

namespace Auditor.Cli;

/// <summary>Where a command writes: results to the output, problems to the error stream.</summary>
/// <param name="output">Results.</param>
/// <param name="error">Problems and diagnostics.</param>
internal sealed class Terminal(TextWriter output, TextWriter error)
{
    /// <summary>Results.</summary>
    public TextWriter Output { get; } = output;

    /// <summary>Problems and diagnostics.</summary>
    public TextWriter Error { get; } = error;

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
