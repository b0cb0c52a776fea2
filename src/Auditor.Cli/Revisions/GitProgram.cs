namespace Auditor.Cli.Revisions;

/// <summary>Finds the git program.</summary>
internal static class GitProgram
{
    /// <summary>
    /// Full path of git in the folders of PATH; null when there is none. Left to itself the system would also look into the current
    /// folder, and a repository that holds a program called git could have it run.
    /// </summary>
    public static string? Find() => (Environment.GetEnvironmentVariable("PATH") ?? "")
        .Split(Path.PathSeparator, StringSplitOptions.RemoveEmptyEntries)
        .Where(Path.IsPathFullyQualified)
        .Select(folder => Path.Combine(folder, OperatingSystem.IsWindows() ? "git.exe" : "git"))
        .FirstOrDefault(File.Exists);
}
