using System.Text.RegularExpressions;
using Auditor.Cli;

namespace Auditor.Hostile.Tests;

/// <summary>Runs a case in this process, and tells what it got in the words of the list.</summary>
internal static partial class HostileRun
{
    private const int MostShown = 2;

    /// <summary>Many times what the slowest case takes; who waits for ever is found.</summary>
    private static readonly TimeSpan Longest = TimeSpan.FromMinutes(10);

    /// <summary>The exit code, and the first problems with line and column.</summary>
    public static string Outcome(HostileCase hostile)
    {
        using var folder = new HostileFolder();
        hostile.Put(folder);
        using var output = new StringWriter();
        using var error = new StringWriter();
        var code = Task.Run(() => AuditorProgram.Run([.. hostile.Arguments.Select(argument => argument.Replace("{folder}", folder.Path, StringComparison.Ordinal))], output, error))
            .WaitAsync(Longest, TestContext.Current.CancellationToken).GetAwaiter().GetResult();
        var problems = Problem().Matches(error.ToString());
        Assert.Equal(code == ExitCode.Problems, problems.Count > 0);
        Assert.DoesNotContain("Exception", error.ToString(), StringComparison.Ordinal);
        var shown = problems.Take(MostShown).Select(problem => $"`{problem.Groups["code"].Value}`{problem.Groups["place"].Value.Replace(':', ' ').Trim() switch { "" => "", var place => " at " + place.Replace(' ', ':') }}");
        return string.Join(", ", shown.Prepend(code switch
        {
            ExitCode.Clean => "0",
            ExitCode.Found => "1",
            _ => "2",
        })) + (problems.Count > MostShown ? ", …" : "");
    }

    /// <summary>Head of a problem: a path, the place in it, the code.</summary>
    [GeneratedRegex(@"^(?:\S[^\n]*?(?<place>:\d+:\d+)?: )?error (?<code>[a-z0-9-]+): ", RegexOptions.Multiline | RegexOptions.ExplicitCapture, matchTimeoutMilliseconds: 10_000)]
    private static partial Regex Problem();
}
