namespace Auditor.Reports.Tests;

/// <summary>A folder for the files of one test, removed afterwards.</summary>
internal sealed class TemporaryFolder : IDisposable
{
    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("reports-");

    public string Path => _folder.FullName;

    public string Write(string name, string text)
    {
        var path = System.IO.Path.Combine(Path, name);
        Directory.CreateDirectory(System.IO.Path.GetDirectoryName(path)!);
        File.WriteAllText(path, text);
        return path;
    }

    public void Link(string name, string target) => File.CreateSymbolicLink(System.IO.Path.Combine(Path, name), target);

    public void Dispose() => _folder.Delete(recursive: true);
}
