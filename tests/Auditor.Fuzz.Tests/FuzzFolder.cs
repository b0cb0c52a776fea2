using Auditor.Testing;

namespace Auditor.Fuzz.Tests;

/// <summary>A folder with copies of good files, one of which is overwritten with a bad one at a time.</summary>
internal sealed class FuzzFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("auditor-fuzz-").FullName;

    /// <summary>Copies a folder of the checkout.</summary>
    public FuzzFolder With(string source, string target = ".")
    {
        var root = Repository.PathOf(source);
        foreach (var file in Directory.EnumerateFiles(root, "*", SearchOption.AllDirectories))
        {
            var copy = File(System.IO.Path.Combine(target, System.IO.Path.GetRelativePath(root, file)));
            Directory.CreateDirectory(System.IO.Path.GetDirectoryName(copy)!);
            System.IO.File.Copy(file, copy);
        }

        return this;
    }

    public string File(string name) => System.IO.Path.GetFullPath(System.IO.Path.Combine(Path, name));

    /// <summary>Writes a file, over what is there.</summary>
    /// <returns>Its full path.</returns>
    public string Write(string name, byte[] content)
    {
        System.IO.File.WriteAllBytes(File(name), content);
        return File(name);
    }

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
