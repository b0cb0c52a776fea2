namespace Auditor.Cli.Tests;

/// <summary>A folder that goes when the test ends.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("auditor-").FullName;

    public string File(string name) => System.IO.Path.Combine(Path, name);

    public void CopyFrom(string source)
    {
        foreach (var file in Directory.EnumerateFiles(source, "*", SearchOption.AllDirectories))
        {
            var target = File(System.IO.Path.GetRelativePath(source, file));
            Directory.CreateDirectory(System.IO.Path.GetDirectoryName(target)!);
            System.IO.File.Copy(file, target);
        }
    }

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
