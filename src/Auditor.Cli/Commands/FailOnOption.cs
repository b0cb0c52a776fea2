using System.CommandLine;

namespace Auditor.Cli.Commands;

/// <summary>The option that sets the threshold of exit code 1.</summary>
internal static class FailOnOption
{
    public static Option<FailOn> Make() => new("--fail-on")
    {
        Description = "Least severe kind of finding that makes the exit code 1; each counts the more severe ones as well.",
        DefaultValueFactory = _ => FailOn.Undetermined,
    };
}
