namespace Auditor.Cli.Tests;

/// <summary>A folder that goes when the test ends.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("auditor-").FullName;

    public string File(string name) => System.IO.Path.Combine(Path, name);

    /// <summary>Copies all files below a folder, over what is there.</summary>
    /// <param name="source">Full path of the folder.</param>
    /// <param name="into">Folder to copy into, from this one.</param>
    public void CopyFrom(string source, string into = "")
    {
        foreach (var file in Directory.EnumerateFiles(source, "*", SearchOption.AllDirectories))
        {
            var target = File(System.IO.Path.Combine(into, System.IO.Path.GetRelativePath(source, file)));
            Directory.CreateDirectory(System.IO.Path.GetDirectoryName(target)!);
            // Written rather than copied: git takes a file of the same size and time for the same file.
            System.IO.File.WriteAllBytes(target, System.IO.File.ReadAllBytes(file));
        }
    }

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
