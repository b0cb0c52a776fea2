using System.Diagnostics;

namespace Auditor.Mutation;

/// <summary>A built test project, copied to a place where the mutated assemblies stand among its own.</summary>
internal sealed class TestProject
{
    private readonly string _folder;
    private readonly string _tests;

    /// <summary>Copies what was built.</summary>
    /// <param name="tests">Full path of the folder of all test projects.</param>
    /// <param name="wanted">Name of the project; with a colon and the names of classes, only their tests.</param>
    /// <param name="work">Where the copy goes; within the checkout, since tests look for its root.</param>
    public TestProject(string tests, string wanted, string work)
    {
        _tests = wanted;
        Name = wanted.Split(':')[0];
        var built = FolderOf(tests, Name);
        _folder = Path.Combine(work, Name);
        foreach (var file in Directory.EnumerateFiles(built, "*", SearchOption.AllDirectories).Where(file => !file.Contains("TestResults", StringComparison.Ordinal)))
        {
            var copy = Path.Combine(_folder, Path.GetRelativePath(built, file));
            Directory.CreateDirectory(Path.GetDirectoryName(copy)!);
            File.Copy(file, copy, overwrite: true);
        }

        File.Copy(typeof(TestProject).Assembly.Location, Path.Combine(_folder, "Auditor.Mutation.dll"), overwrite: true);
    }

    public string Name { get; }

    /// <summary>Where a test project is built.</summary>
    public static string FolderOf(string tests, string name) => Path.Combine(tests, name, "bin", "Release", "net10.0");

    /// <summary>Puts a mutated assembly in the place of the one that was built.</summary>
    public void Take(string assembly) => File.Copy(assembly, Path.Combine(_folder, Path.GetFileName(assembly)), overwrite: true);

    /// <summary>Runs a process of <see cref="Trials"/> in it; its results, one by one.</summary>
    public IEnumerable<string[]> Run(params string[] arguments)
    {
        var start = new ProcessStartInfo("dotnet") { UseShellExecute = false, RedirectStandardOutput = true, RedirectStandardError = true, WorkingDirectory = _folder };
        string[] line =
        [
            "exec", "--depsfile", Path.Combine(_folder, Name + ".deps.json"), "--runtimeconfig", Path.Combine(_folder, Name + ".runtimeconfig.json"),
            Path.Combine(_folder, "Auditor.Mutation.dll"), "--within", _tests, .. arguments,
        ];
        Array.ForEach(line, start.ArgumentList.Add);
        using var process = Process.Start(start)!;
        var errors = process.StandardError.ReadToEndAsync();
        while (process.StandardOutput.ReadLine() is { } said)
        {
            if (said.StartsWith(Trials.Prefix, StringComparison.Ordinal))
            {
                yield return said[Trials.Prefix.Length..].Split('\t');
            }
        }

        process.WaitForExit();
        if (process.ExitCode != 0 && arguments[0] == "cover")
        {
            throw new InvalidOperationException(errors.GetAwaiter().GetResult());
        }
    }
}
