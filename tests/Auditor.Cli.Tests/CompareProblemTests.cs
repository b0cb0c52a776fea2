using System.Runtime.Versioning;

namespace Auditor.Cli.Tests;

/// <summary>What cannot be compared is told, and nothing that a repository holds is run or written elsewhere.</summary>
public class CompareProblemTests
{
    private const string Site = "yard/site.design.yaml";

    [Theory]
    [InlineData("nowhere:yard/site.design.yaml", "error unknown-revision: the repository has no revision `nowhere`")]
    [InlineData(":yard/site.design.yaml", "error unknown-revision: the repository has no revision ``")]
    [InlineData("first:yard/sight.design.yaml", "did you mean `yard/site.design.yaml`?")]
    [InlineData("first:yard", "error unknown-path: there is no file `yard` in revision `first`")]
    [InlineData("first:../../etc/hosts.yaml", "error unknown-path: there is no file `../../etc/hosts.yaml` in revision `first`")]
    [InlineData("none.design.yaml", "none.design.yaml: error file-missing")]
    [InlineData("none.json", "none.json: error file-missing")]
    public void What_is_not_there_is_a_problem_with_help(string before, string problem)
    {
        using var repository = new GitRepository();

        var result = Tool.RunIn(repository.Path, ["compare", before, Site]);

        Assert.Equal(2, result.Code);
        Assert.Contains(problem, result.Error, StringComparison.Ordinal);
        Assert.Empty(result.Output);
    }

    [Theory]
    [InlineData("--output=taken:yard/site.design.yaml")]
    [InlineData("-h:yard/site.design.yaml")]
    public void A_revision_that_looks_like_an_option_reaches_git_as_none(string before)
    {
        using var repository = new GitRepository();

        var result = Tool.RunIn(repository.Path, ["compare", "--", before, Site]);

        Assert.Equal(2, result.Code);
        Assert.Contains("error unknown-revision", result.Error, StringComparison.Ordinal);
        Assert.False(File.Exists(repository.File("taken")));
    }

    [Fact]
    public void A_folder_outside_any_repository_is_told_to_be_one()
    {
        using var folder = new TemporaryFolder();

        var result = Tool.RunIn(folder.Path, ["compare", "main:a.design.yaml", "a.design.yaml"]);

        Assert.Equal(2, result.Code);
        Assert.Contains("error git-no-repository", result.Error, StringComparison.Ordinal);
    }

    [Fact]
    [UnsupportedOSPlatform("windows")]
    public void A_program_called_git_in_the_repository_is_not_run()
    {
        using var repository = new GitRepository();
        File.WriteAllText(repository.File("git"), "#!/bin/sh\ntouch ran\n");
        File.SetUnixFileMode(repository.File("git"), UnixFileMode.UserRead | UnixFileMode.UserWrite | UnixFileMode.UserExecute);

        var result = Tool.RunIn(repository.Path, ["compare", $"first:{Site}", Site], ("PATH", "/nonexistent:.:"));

        Assert.Equal(2, result.Code);
        Assert.Contains("error git-missing", result.Error, StringComparison.Ordinal);
        Assert.False(File.Exists(repository.File("ran")));
    }

    [Fact]
    public void A_commit_whose_paths_lead_outside_writes_nothing_there()
    {
        using var repository = new GitRepository();
        using var temporary = new TemporaryFolder();
        var blob = repository.Run(["hash-object", "-w", "--stdin"], "set: evil\n");
        var evil = repository.Run(["mktree"], $"100644 blob {blob}\tevil.yaml\n");
        var tree = repository.Run(["mktree"], $"040000 tree {evil}\t..\n040000 tree {repository.Run("rev-parse", "first:yard")}\tyard\n");
        repository.Run("tag", "evil", repository.Run("-c", "user.name=R. Example", "-c", "user.email=r@yard.example", "commit-tree", tree, "-m", "evil"));

        var result = Tool.RunIn(repository.Path, ["compare", $"evil:{Site}", $"first:{Site}"], ("TMPDIR", temporary.Path));

        Assert.Equal(0, result.Code);
        Assert.Empty(Directory.EnumerateFiles(temporary.Path, "evil.yaml", SearchOption.AllDirectories));
    }

    [Fact]
    public void Problems_of_a_design_in_a_revision_name_the_revision()
    {
        using var repository = new GitRepository();
        repository.Edit("yard/boards/workshop.board.yaml", "rating: 6 A", "rating: 6");
        repository.Commit("broken");

        var result = Tool.RunIn(repository.Path, ["compare", $"broken:{Site}", $"third:{Site}"]);

        Assert.Equal(2, result.Code);
        Assert.Contains("broken:yard/boards/workshop.board.yaml:11:23: error", result.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void A_rule_set_outside_the_repository_is_out_of_reach()
    {
        using var repository = new GitRepository();
        repository.Edit(Site, "rule-set: rules/plain.yaml", "rule-set: ../../plain.yaml");
        repository.Commit("outside");

        var result = Tool.RunIn(repository.Path, ["compare", $"outside:{Site}", $"third:{Site}"]);

        Assert.Equal(2, result.Code);
        Assert.Contains("error rule-set-outside", result.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void A_comparison_is_not_written_in_a_format_that_it_has_not()
    {
        using var repository = new GitRepository();

        var result = Tool.RunIn(repository.Path, ["compare", $"first:{Site}", Site, "--write", "changes.xml"]);

        Assert.Equal(2, result.Code);
        Assert.Contains("known endings: .md, .json, .sarif", result.Error, StringComparison.Ordinal);
    }
}
