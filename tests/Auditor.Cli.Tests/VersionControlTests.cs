using System.Diagnostics;
using System.Text.Json;
using Auditor.Testing;

namespace Auditor.Cli.Tests;

/// <summary>The scripts and settings of <c>examples/version-control</c>, in a repository with two revisions of a design.</summary>
public sealed class VersionControlTests : IDisposable
{
    private const string Documents = "examples/version-control";

    private readonly TemporaryFolder _folder = new();

    public VersionControlTests()
    {
        Directory.CreateDirectory(Design("."));
        var program = _folder.File("auditor");
        File.WriteAllText(program, $"#!/bin/sh\nexec dotnet '{Path.Combine(AppContext.BaseDirectory, "auditor.dll")}' \"$@\"\n");
        Start("chmod", "+x", program);
        Git("init", "--quiet");
        Git("config", "user.name", "R. Example");
        Git("config", "user.email", "r.example@example.org");
    }

    [Fact]
    public void The_hook_lets_a_sound_revision_pass_and_stops_one_that_breaks_a_requirement()
    {
        InstallHook();
        Tool.RunIn(Design("."), ["new", "house"]);
        Git("add", ".");
        var sound = TryGit("commit", "--quiet", "-m", "Revision A");

        Replace("house.design.yaml", "length: 24 m", "length: 240 m");
        Git("add", ".");
        var broken = TryGit("commit", "--quiet", "-m", "Revision B");

        Assert.Equal(0, sound.Code);
        Assert.NotEqual(0, broken.Code);
        Assert.Contains("Requirements not met, to be put right: 1", broken.Output + broken.Error, StringComparison.Ordinal);
        Assert.Equal("Revision A\n", Git("log", "--format=%s"));
    }

    [Fact]
    public void The_hook_looks_at_what_is_staged_and_not_at_what_lies_about()
    {
        InstallHook();
        Tool.RunIn(Design("."), ["new", "house"]);
        Git("add", ".");
        Replace("house.design.yaml", "length: 24 m", "length: 240 m");

        Assert.Equal(0, TryGit("commit", "--quiet", "-m", "Revision A").Code);
    }

    [Fact]
    public void The_hook_stops_a_design_that_cannot_be_audited_and_lets_other_files_pass()
    {
        InstallHook();
        File.WriteAllText(Design("notes.txt"), "Call the baker.");
        Git("add", ".");
        var notes = TryGit("commit", "--quiet", "-m", "Notes");
        File.WriteAllText(Design("a.design.yaml"), "design-format: 1\n");
        Git("add", ".");
        var bad = TryGit("commit", "--quiet", "-m", "Design");

        Assert.Equal(0, notes.Code);
        Assert.NotEqual(0, bad.Code);
        Assert.Contains("lacks `boards`", bad.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void The_job_of_a_pull_request_leaves_its_files_beside_each_design()
    {
        Directory.CreateDirectory(Design("jobs/no 7"));
        Tool.RunIn(Design("jobs/no 7"), ["new", "house"]);
        Replace("jobs/no 7/house.design.yaml", "length: 24 m", "length: 240 m");

        var result = Start("sh", Repository.PathOf($"{Documents}/pull-request"));

        Assert.Equal(1, result.Code);
        Assert.Contains("voltage-drop-lighting:CU/1", File.ReadAllText(Design("jobs/no 7/house.audit.md")), StringComparison.Ordinal);
        Assert.Contains("<failure ", File.ReadAllText(Design("jobs/no 7/house.junit.xml")), StringComparison.Ordinal);
        using var sarif = JsonDocument.Parse(File.ReadAllText(Design("jobs/no 7/house.sarif")));
        var place = sarif.RootElement.GetProperty("runs")[0].GetProperty("originalUriBaseIds").GetProperty("DESIGN");
        Assert.Equal(("jobs/no%207/", "%SRCROOT%"), (place.GetProperty("uri").GetString(), place.GetProperty("uriBaseId").GetString()));
    }

    [Fact]
    public void The_job_tells_what_a_pull_request_changes_in_designs_that_its_target_has()
    {
        Tool.RunIn(Design("."), ["new", "house"]);
        Git("add", ".");
        Git("commit", "--quiet", "-m", "Revision A");
        Tool.RunIn(Design("."), ["new", "shed"]);
        Replace("house.design.yaml", "length: 24 m", "length: 240 m");
        Git("add", ".");

        var result = Start("sh", Repository.PathOf($"{Documents}/pull-request"), "HEAD");

        Assert.Equal(1, result.Code);
        Assert.Contains("CU/1/leg 1 length: 24 m → 240 m", File.ReadAllText(Design("house.changes.md")), StringComparison.Ordinal);
        Assert.False(File.Exists(Design("shed.changes.md")));
    }

    [Fact]
    public void Diffs_say_which_circuit_and_which_finding_a_change_belongs_to()
    {
        Tool.RunIn(Design("."), ["new", "house"]);
        File.Copy(Repository.PathOf($"{Documents}/gitattributes"), Design(".gitattributes"));
        Git("config", "include.path", Repository.PathOf($"{Documents}/gitconfig"));
        Audit();
        Git("add", ".");
        Git("commit", "--quiet", "-m", "Revision A");
        Replace("house.design.yaml", "length: 24 m", "length: 40 m");
        Audit();

        Assert.Matches(@"@@ name: Lighting\n", Git("diff", "--unified=0", "house.design.yaml"));
        Assert.Matches(@"\n\+ *{""key"":""voltage-drop-lighting:CU/1"",""rule""", Git("diff", "--unified=0", "house.findings.json"));
    }

    public void Dispose() => _folder.Dispose();

    private string Design(string name) => _folder.File(Path.Combine("designs", name));

    private void Replace(string name, string from, string to) => File.WriteAllText(Design(name), File.ReadAllText(Design(name)).Replace(from, to, StringComparison.Ordinal));

    private void Audit() => Tool.RunIn(Design("."), ["audit", "house.design.yaml", "--quiet", "--as-of", "2026-12-01", "--write", "house.findings.json"]);

    private void InstallHook() => File.Copy(Repository.PathOf($"{Documents}/pre-commit"), Design(".git/hooks/pre-commit"));

    private string Git(params string[] arguments)
    {
        var result = TryGit(arguments);
        return result.Code == 0 ? result.Output : throw new InvalidOperationException(result.Error);
    }

    private ToolResult TryGit(params string[] arguments) => Start("git", arguments);

    private ToolResult Start(string program, params string[] arguments)
    {
        var start = new ProcessStartInfo(program, arguments) { UseShellExecute = false, WorkingDirectory = Design("."), RedirectStandardOutput = true, RedirectStandardError = true };
        start.Environment["AUDITOR"] = _folder.File("auditor");
        start.Environment["GIT_CONFIG_GLOBAL"] = "/dev/null";
        start.Environment["GIT_CONFIG_NOSYSTEM"] = "1";
        using var process = Process.Start(start)!;
        var error = process.StandardError.ReadToEndAsync();
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        return new ToolResult(process.ExitCode, output, error.GetAwaiter().GetResult());
    }
}
