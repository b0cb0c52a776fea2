namespace Auditor.Testing;

/// <summary>The program that tests start as a user does: the published one that the environment variable <c>AUDITOR_PROGRAM</c> names by its full path, else the one just built.</summary>
public static class ProgramUnderTest
{
    /// <summary>Full path of the program.</summary>
    public static string Path { get; } = Environment.GetEnvironmentVariable("AUDITOR_PROGRAM") is { Length: > 0 } published
        ? published
        : System.IO.Path.Combine(AppContext.BaseDirectory, "auditor");
}
