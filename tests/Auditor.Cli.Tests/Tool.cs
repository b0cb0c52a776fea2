using System.Diagnostics;
using Auditor.Testing;

namespace Auditor.Cli.Tests;

/// <summary>Runs the program as a user does, in a folder of the checkout or elsewhere.</summary>
internal static class Tool
{
    /// <summary>Runs a command line from the root of the checkout.</summary>
    public static ToolResult Run(params string[] arguments) => RunIn(Repository.PathOf("."), arguments);

    /// <summary>Runs a command line in a folder, with further environment variables as <c>NAME=value</c> before the arguments.</summary>
    public static ToolResult RunIn(string folder, IReadOnlyList<string> arguments, params (string Name, string Value)[] environment)
    {
        var start = new ProcessStartInfo(ProgramUnderTest.Path) { UseShellExecute = false, WorkingDirectory = folder, RedirectStandardOutput = true, RedirectStandardError = true, RedirectStandardInput = true };
        foreach (var argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        foreach (var (name, value) in environment)
        {
            start.Environment[name] = value;
        }

        using var process = Process.Start(start)!;
        process.StandardInput.Close();
        var error = process.StandardError.ReadToEndAsync();
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return new ToolResult(process.ExitCode, output, error.GetAwaiter().GetResult());
    }
}
