namespace Auditor.Cli;

/// <summary>Exit codes of every command.</summary>
internal static class ExitCode
{
    /// <summary>Nothing at or above the threshold.</summary>
    public const int Clean = 0;

    /// <summary>Findings at or above the threshold, or failed cases.</summary>
    public const int Found = 1;

    /// <summary>The work could not be done: problems in a design, in rules or in the arguments.</summary>
    public const int Problems = 2;
}
