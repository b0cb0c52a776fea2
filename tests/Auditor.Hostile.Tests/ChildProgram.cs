using System.Diagnostics;
using System.Text;
using Auditor.Testing;

namespace Auditor.Hostile.Tests;

/// <summary>Runs the built program as a process of its own, in a folder, by a line of the shell: for what only the system can do to it.</summary>
internal sealed class ChildProgram : IDisposable
{
    private readonly StringBuilder _output = new();
    private readonly StringBuilder _error = new();

    private ChildProgram(Process process)
    {
        Process = process;
        process.OutputDataReceived += (_, line) => _output.AppendLine(line.Data);
        process.ErrorDataReceived += (_, line) => _error.AppendLine(line.Data);
        process.BeginOutputReadLine();
        process.BeginErrorReadLine();
    }

    public Process Process { get; }

    /// <summary>What it printed on standard error; complete once it has ended.</summary>
    public string Error => _error.ToString();

    /// <summary>Starts a line of the shell, in which <c>$AUDITOR</c> is the program.</summary>
    public static ChildProgram Start(string folder, string line)
    {
        var start = new ProcessStartInfo("bash") { UseShellExecute = false, WorkingDirectory = folder, RedirectStandardOutput = true, RedirectStandardError = true };
        start.ArgumentList.Add("-c");
        start.ArgumentList.Add(line.Replace("$AUDITOR", $"'{ProgramUnderTest.Path}'", StringComparison.Ordinal));
        return new ChildProgram(System.Diagnostics.Process.Start(start)!);
    }

    /// <summary>Runs a line of the shell to its end.</summary>
    /// <returns>Its exit code, and what it printed on standard error.</returns>
    public static (int Code, string Error) Run(string folder, string line)
    {
        using var child = Start(folder, line);
        child.Process.WaitForExit();
        return (child.Process.ExitCode, child.Error);
    }

    public void Dispose()
    {
        if (!Process.HasExited)
        {
            Process.Kill(entireProcessTree: true);
        }

        Process.Dispose();
    }
}
