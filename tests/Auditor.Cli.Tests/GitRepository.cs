using System.Diagnostics;
using Auditor.Testing;

namespace Auditor.Cli.Tests;

/// <summary>A git repository in a folder that goes when the test ends.</summary>
internal sealed class GitRepository : IDisposable
{
    private const string Revisions = "tests/Auditor.Cli.Tests/revisions";
    private const string Rules = "tests/Auditor.Engine.Tests/Comparisons/rules";

    private readonly TemporaryFolder _folder = new();

    /// <summary>A repository with the three revisions of a yard as tags.</summary>
    public GitRepository()
    {
        Run("init", "--quiet");
        _folder.CopyFrom(Repository.PathOf(Rules), "yard/rules");
        foreach (var revision in new[] { "first", "second", "third" })
        {
            _folder.CopyFrom(Repository.PathOf($"{Revisions}/{revision}"), "yard");
            if (revision == "third")
            {
                Edit("yard/rules/plain.yaml", "value: 4 %", "value: 3.9 %");
                Edit("yard/rules/tables/copper.yaml", "[10, 4]", "[10, 4.2]");
            }

            Commit(revision);
        }
    }

    /// <summary>A repository of which the first revision, tagged `first`, is a copy of the folder, at the top.</summary>
    /// <param name="folder">The folder, below the checkout.</param>
    public GitRepository(string folder)
    {
        Run("init", "--quiet");
        _folder.CopyFrom(Repository.PathOf(folder));
        Commit("first");
    }

    public string Path => _folder.Path;

    public string File(string name) => _folder.File(name);

    public void Edit(string file, string old, string replacement)
    {
        var text = System.IO.File.ReadAllText(File(file));
        Assert.Contains(old, text, StringComparison.Ordinal);
        System.IO.File.WriteAllText(File(file), text.Replace(old, replacement, StringComparison.Ordinal));
    }

    /// <summary>Commits everything and tags it.</summary>
    public void Commit(string tag)
    {
        Run("add", "--all");
        Run("-c", "user.name=R. Example", "-c", "user.email=r@yard.example", "commit", "--quiet", "--message", tag);
        Run("tag", tag);
    }

    /// <summary>Runs git in the repository.</summary>
    /// <returns>What it wrote.</returns>
    public string Run(params string[] arguments) => Run(arguments, "");

    /// <summary>Runs git in the repository with something to read.</summary>
    public string Run(string[] arguments, string input)
    {
        var start = new ProcessStartInfo("git") { UseShellExecute = false, WorkingDirectory = Path, RedirectStandardOutput = true, RedirectStandardInput = true };
        start.Environment["GIT_CONFIG_GLOBAL"] = "/dev/null";
        Array.ForEach(arguments, start.ArgumentList.Add);
        using var process = Process.Start(start)!;
        process.StandardInput.Write(input);
        process.StandardInput.Close();
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        Assert.Equal(0, process.ExitCode);
        return output.TrimEnd('\n');
    }

    public void Dispose() => _folder.Dispose();
}
