using System.Diagnostics;
using System.Text;
using Auditor.Testing;

namespace Auditor.Hostile.Tests;

/// <summary>A folder that goes when the test ends, with whatever a case puts into it.</summary>
internal sealed class HostileFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("auditor-hostile-").FullName;

    public string File(string name) => System.IO.Path.Combine(Path, name);

    /// <summary>Writes a file, and the folders that it lies in.</summary>
    public HostileFolder Write(string name, string text) => Write(name, Encoding.UTF8.GetBytes(text));

    /// <summary>Writes a file, and the folders that it lies in.</summary>
    public HostileFolder Write(string name, byte[] bytes)
    {
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(File(name))!);
        System.IO.File.WriteAllBytes(File(name), bytes);
        return this;
    }

    /// <summary>Copies a file of the checkout.</summary>
    public HostileFolder Copy(string source, string name) => Write(name, System.IO.File.ReadAllBytes(Repository.PathOf(source)));

    /// <summary>Makes a symbolic link.</summary>
    /// <param name="name">Its name.</param>
    /// <param name="target">The path in it, as it is.</param>
    public HostileFolder Link(string name, string target)
    {
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(File(name))!);
        System.IO.File.CreateSymbolicLink(File(name), target);
        return this;
    }

    /// <summary>Makes a pipe with a name: whoever opens it to read waits for somebody who writes.</summary>
    public HostileFolder Pipe(string name)
    {
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(File(name))!);
        using var process = Process.Start("mkfifo", File(name));
        process.WaitForExit();
        Assert.Equal(0, process.ExitCode);
        return this;
    }

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
