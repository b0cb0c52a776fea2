using System.Text.Json;

namespace Auditor.Cli.Tests;

/// <summary>Findings files stand for the audits that wrote them, as far as they tell.</summary>
public class CompareFindingsTests
{
    private const string Site = "yard/site.design.yaml";

    /// <summary>A repository at its second revision, with the findings of the first.</summary>
    private static GitRepository WithFindings(params string[] options)
    {
        var repository = new GitRepository();
        repository.Run("checkout", "--quiet", "first");
        Assert.NotEqual(2, Tool.RunIn(repository.Path, ["audit", Site, "--quiet", "--write", "first.json", .. options]).Code);
        repository.Run("checkout", "--quiet", "second");
        return repository;
    }

    private static JsonElement Compare(GitRepository repository, string before, string after)
    {
        var result = Tool.RunIn(repository.Path, ["compare", before, after, "--write", "changes.json"]);
        Assert.Empty(result.Error);
        CompareRevisionsTests.AssertKeepsSchema(repository.File("changes.json"));
        return JsonDocument.Parse(File.ReadAllText(repository.File("changes.json"))).RootElement;
    }

    private static string[] Changes(JsonElement comparison) =>
        [.. comparison.GetProperty("findings").EnumerateArray().Select(change => $"{change.GetProperty("change").GetString()} {change.GetProperty("key").GetString()}")];

    [Fact]
    public void Findings_with_full_evidence_tell_all_but_the_causes()
    {
        using var repository = WithFindings("--evidence");

        var audits = Compare(repository, $"first:{Site}", Site);
        var files = Compare(repository, "first.json", Site);

        Assert.Equal(Changes(audits), Changes(files));
        Assert.Equal(audits.GetProperty("inputs").ToString(), files.GetProperty("inputs").ToString());
        Assert.Equal(audits.GetProperty("subjects").ToString(), files.GetProperty("subjects").ToString());
        Assert.True(files.GetProperty("inputsKnown").GetBoolean());
        Assert.False(files.GetProperty("causesKnown").GetBoolean());
    }

    [Fact]
    public void Findings_alone_know_subjects_by_their_names()
    {
        using var repository = WithFindings();

        var files = Compare(repository, "first.json", Site);

        Assert.Equal(Changes(Compare(repository, $"first:{Site}", Site)), Changes(files));
        Assert.False(files.GetProperty("inputsKnown").GetBoolean());
        Assert.Empty(files.GetProperty("inputs").EnumerateArray());
    }

    [Fact]
    public void With_one_rule_set_on_both_sides_only_the_design_can_have_moved_anything()
    {
        using var repository = WithFindings();

        var moved = Compare(repository, "first.json", Site).GetProperty("findings").EnumerateArray()
            .Where(change => change.GetProperty("change").GetString() != "unchanged")
            .Select(change => Assert.Single(change.GetProperty("movedBy").EnumerateArray()).GetString()).Distinct();

        Assert.Equal(["design"], moved);
    }

    [Fact]
    public void A_findings_file_of_a_revision_is_read_from_the_repository()
    {
        using var repository = WithFindings();
        repository.Commit("with-findings");
        File.Delete(repository.File("first.json"));

        Assert.Equal("with-findings:first.json", Compare(repository, "with-findings:first.json", Site).GetProperty("before").GetProperty("name").GetString());
    }

    [Fact]
    public void Against_earlier_findings_only_what_is_new_or_worse_counts()
    {
        using var repository = WithFindings();
        string[] audit = ["audit", Site, "--fail-on", "nonconforming"];
        Assert.Equal(1, Tool.RunIn(repository.Path, [.. audit, "--quiet"]).Code);

        var second = Tool.RunIn(repository.Path, [.. audit, "--against", "first.json"]);
        Tool.RunIn(repository.Path, ["audit", Site, "--quiet", "--write", "second.json"]);

        Assert.Equal(1, second.Code);
        Assert.Contains("first.json → yard/site.design.yaml", second.Output, StringComparison.Ordinal);
        Assert.Contains("New nonconformities: 2", second.Output, StringComparison.Ordinal);
        Assert.Equal(0, Tool.RunIn(repository.Path, [.. audit, "--quiet", "--against", "second.json"]).Code);
        Assert.Equal(0, Tool.RunIn(repository.Path, [.. audit, "--quiet", "--against", $"second:{Site}"]).Code);
    }

    [Fact]
    public void Findings_may_be_written_over_those_that_were_compared_with()
    {
        using var repository = WithFindings();

        Assert.Equal(1, Tool.RunIn(repository.Path, ["audit", Site, "--quiet", "--against", "first.json", "--write", "first.json"]).Code);
        Assert.Equal(0, Tool.RunIn(repository.Path, ["audit", Site, "--quiet", "--against", "first.json", "--write", "first.json"]).Code);
    }

    [Fact]
    public void Several_designs_need_a_name_in_the_path_of_their_findings()
    {
        using var repository = WithFindings();
        File.Copy(repository.File(Site), repository.File("yard/other.design.yaml"));

        Assert.Equal(2, Tool.RunIn(repository.Path, ["audit", "yard", "--against", "first.json"]).Code);
        Tool.RunIn(repository.Path, ["audit", "yard", "--quiet", "--write", "{name}.json"]);
        Assert.Equal(0, Tool.RunIn(repository.Path, ["audit", "yard", "--quiet", "--against", "{name}.json"]).Code);
    }

    [Theory]
    [InlineData("{", "broken.json:")]
    [InlineData("[]", "broken.json:1:1: error")]
    [InlineData("{ \"format\": 2 }", "broken.json:1:3: error missing-key")]
    public void A_file_that_is_no_findings_file_is_told_as_one(string text, string problem)
    {
        using var repository = new GitRepository();
        File.WriteAllText(repository.File("broken.json"), text);

        var result = Tool.RunIn(repository.Path, ["compare", "broken.json", Site]);

        Assert.Equal(2, result.Code);
        Assert.StartsWith(problem, result.Error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("\"subject\":\"A/2\"", "\"subject\":\"A/9\"", "error findings-not-listed: this file does not list the subject `A/9`")]
    [InlineData("\"key\":\"A/2\"", "\"key\":\"A/1\"", "error findings-listed-twice: this file lists the subject `A/1` a second time")]
    public void A_findings_file_that_contradicts_itself_is_refused(string old, string replacement, string problem)
    {
        using var repository = WithFindings();
        repository.Edit("first.json", old, replacement);

        var result = Tool.RunIn(repository.Path, ["compare", "first.json", Site]);

        Assert.Equal(2, result.Code);
        Assert.Contains(problem, result.Error, StringComparison.Ordinal);
    }
}
