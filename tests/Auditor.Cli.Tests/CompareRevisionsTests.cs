using System.Text.Json;
using Auditor.Documents;
using Auditor.Testing;

namespace Auditor.Cli.Tests;

/// <summary>
/// A yard in three revisions. The second renames the board of the origin, swaps its circuits, writes some of it otherwise, lengthens the
/// lamps' cable and adds sockets; the third lengthens the saw's cable, frees a way, and changes a limit and a table of the house set.
/// </summary>
public class CompareRevisionsTests
{
    private const string Golden = "tests/Auditor.Cli.Tests/revisions/";
    private const string Site = "yard/site.design.yaml";

    [Theory]
    [InlineData("first", "second")]
    [InlineData("second", "third")]
    public void A_revision_is_compared_with_the_one_before_it(string before, string after)
    {
        using var repository = new GitRepository();

        // What is compared lies in the repository alone.
        Directory.Delete(repository.File("yard"), recursive: true);
        var result = Tool.RunIn(repository.Path, ["compare", $"{before}:{Site}", $"{after}:{Site}", "--write", "changes.md", "--write", "changes.json"]);

        Assert.Empty(result.Error);
        Assert.Equal(1, result.Code);
        Auditor.Testing.Golden.Match(result.Output, Golden + after);
        Auditor.Testing.Golden.Match(File.ReadAllText(repository.File("changes.md")), Golden + after, "md");
        Auditor.Testing.Golden.Match(File.ReadAllText(repository.File("changes.json")), Golden + after, "json");
        AssertKeepsSchema(repository.File("changes.json"));
    }

    [Fact]
    public void No_golden_file_is_left_over() => Assert.Empty(Auditor.Testing.Golden.OrphansBelow(Golden));

    [Fact]
    public void The_working_file_is_compared_with_a_commit()
    {
        using var repository = new GitRepository();
        repository.Edit(Site, "spare-ways: 2", "spare-ways: 0");

        var result = Tool.RunIn(repository.File("yard"), ["compare", "third:./site.design.yaml", "site.design.yaml", "--fail-on", "recommendation"]);

        Assert.Equal(1, result.Code);
        Assert.Contains("spare:GH", result.Output, StringComparison.Ordinal);
        Assert.Contains("GH     spare-ways", Squeezed(result.Output), StringComparison.Ordinal);
        Assert.Contains("the same in both", result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_design_at_the_top_of_the_repository_shows_the_same_places_on_both_sides()
    {
        using var repository = new GitRepository();
        repository.Run("mv", "yard/site.design.yaml", "yard/boards", "yard/rules", ".");
        repository.Commit("flat/top");
        repository.Edit("boards/workshop.board.yaml", "length: 24 m", "length: 25 m");

        var result = Tool.RunIn(repository.Path, ["compare", "flat/top:site.design.yaml", "site.design.yaml", "--write", "changes.json"]);

        Assert.Equal(0, result.Code);
        using var json = JsonDocument.Parse(File.ReadAllText(repository.File("changes.json")));
        var input = Assert.Single(json.RootElement.GetProperty("inputs").EnumerateArray());
        Assert.Equal("boards/workshop.board.yaml", input.GetProperty("before").GetProperty("location").GetProperty("file").GetString());
        Assert.Equal("boards/workshop.board.yaml", input.GetProperty("after").GetProperty("location").GetProperty("file").GetString());
    }

    [Fact]
    public void Nothing_new_or_worse_is_clean_and_the_threshold_decides()
    {
        using var repository = new GitRepository();
        string[] arguments = ["compare", $"third:{Site}", $"second:{Site}", "--quiet"];

        Assert.Equal(0, Tool.RunIn(repository.Path, ["compare", $"third:{Site}", Site]).Code);
        Assert.Equal(0, Tool.RunIn(repository.Path, arguments).Code);
        Assert.Equal(1, Tool.RunIn(repository.Path, [.. arguments, "--fail-on", "recommendation"]).Code);
    }

    [Fact]
    public void The_named_rule_set_judges_both_revisions()
    {
        using var repository = new GitRepository();

        var result = Tool.RunIn(repository.Path, ["compare", $"second:{Site}", $"third:{Site}", "--rules", "yard/rules/plain.yaml"]);

        Assert.Contains("the same in both", result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void The_temporary_folder_goes()
    {
        using var repository = new GitRepository();
        using var temporary = new TemporaryFolder();

        Tool.RunIn(repository.Path, ["compare", $"first:{Site}", $"second:{Site}", "--quiet"], ("TMPDIR", temporary.Path));

        Assert.DoesNotContain(Directory.EnumerateFileSystemEntries(temporary.Path), entry => Path.GetFileName(entry).StartsWith("auditor-", StringComparison.Ordinal));
    }

    [Fact]
    public void Two_runs_write_the_same_bytes()
    {
        using var repository = new GitRepository();
        string[] arguments = ["compare", $"first:{Site}", $"third:{Site}", "--quiet", "--write"];

        Tool.RunIn(repository.Path, [.. arguments, "one.json"], ("LC_ALL", "C"), ("TZ", "Pacific/Auckland"));
        Tool.RunIn(repository.Path, [.. arguments, "other.json"], ("LC_ALL", "de_DE.UTF-8"), ("DOTNET_PROCESSOR_COUNT", "1"));

        Assert.Equal(File.ReadAllBytes(repository.File("one.json")), File.ReadAllBytes(repository.File("other.json")));
    }

    internal static void AssertKeepsSchema(string path)
    {
        var problems = new Problems();
        var schema = Schema.Parse(new SourceText("comparison", File.ReadAllText(Repository.PathOf("rules/schema/comparison.schema.json"))));
        schema.Validate(YamlReader.Read(new SourceText("changes.json", File.ReadAllText(path)), problems)!, problems);
        Assert.False(problems.HasErrors, ProblemText.Render(problems.All));
    }

    private static string Squeezed(string text) => string.Join('\n', text.Split('\n').Select(line => string.Join("     ", line.Split("  ", StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries))));
}
