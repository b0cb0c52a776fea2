using System.ComponentModel;
using System.Diagnostics;
using System.Text;

namespace Auditor.Cli.Revisions;

/// <summary>Runs git in the current folder, only to read. Arguments are passed one by one, never through a shell.</summary>
/// <param name="program">Full path of git.</param>
internal sealed class Git(string program)
{
    /// <summary>Runs git to its end.</summary>
    /// <param name="arguments">The arguments.</param>
    /// <returns>What it wrote; null when it failed, or could not be started.</returns>
    public string? Read(params string[] arguments)
    {
        using var output = new MemoryStream();
        return Run(arguments, null, stream => stream.CopyTo(output)) ? Encoding.UTF8.GetString(output.ToArray()) : null;
    }

    /// <summary>Runs git, gives it lines to read, and reads what it writes meanwhile.</summary>
    /// <param name="arguments">The arguments.</param>
    /// <param name="lines">Lines to read; null for none.</param>
    /// <param name="read">Reads the output; false from it, and git is stopped.</param>
    /// <returns>Whether git ended well and its output could be read.</returns>
    public bool Exchange(IReadOnlyList<string> arguments, IEnumerable<string> lines, Func<Stream, bool> read)
    {
        var isRead = false;
        return Run(arguments, lines, stream => isRead = read(stream)) && isRead;
    }

    private bool Run(IReadOnlyList<string> arguments, IEnumerable<string>? lines, Action<Stream> read)
    {
        try
        {
            using var process = Process.Start(Start(arguments))!;
            var errors = process.StandardError.ReadToEndAsync();
            var writing = Task.Run(() => Feed(process.StandardInput, lines ?? []));
            read(process.StandardOutput.BaseStream);
            process.StandardOutput.Close();
            process.WaitForExit();
            writing.GetAwaiter().GetResult();
            errors.GetAwaiter().GetResult();
            return process.ExitCode == 0;
        }
        catch (Win32Exception)
        {
            return false;
        }
    }

    private ProcessStartInfo Start(IReadOnlyList<string> arguments)
    {
        var start = new ProcessStartInfo(program)
        {
            RedirectStandardInput = true,
            RedirectStandardOutput = true,
            RedirectStandardError = true,
            UseShellExecute = false,
        };
        foreach (var argument in arguments)
        {
            start.ArgumentList.Add(argument);
        }

        // Reading must neither write to the repository, nor ask the user, nor fetch what is not there.
        start.Environment["GIT_OPTIONAL_LOCKS"] = "0";
        start.Environment["GIT_TERMINAL_PROMPT"] = "0";
        start.Environment["GIT_NO_LAZY_FETCH"] = "1";
        start.Environment["LC_ALL"] = "C";
        return start;
    }

    private static void Feed(StreamWriter input, IEnumerable<string> lines)
    {
        try
        {
            foreach (var line in lines)
            {
                input.Write(line + "\n");
            }

            input.Close();
        }
        catch (IOException)
        {
            // Git ended before it had read everything; its exit code tells why.
        }
    }
}
