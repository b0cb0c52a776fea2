using System.Text.Json;
using Auditor.Documents;
using Auditor.Testing;

namespace Auditor.Cli.Tests;

public class RemediesCommandTests
{
    private const string Bakery = "examples/bakery/bakery.design.yaml";

    [Fact]
    public void Remedies_are_listed_with_their_margins_and_none_is_said_plainly()
    {
        var result = Tool.Run("remedies", Bakery);

        Assert.Equal(0, result.Code);
        Assert.Contains("type of the circuit-breaker of BK/3 Spiral dough mixer: D to C", result.Output, StringComparison.Ordinal);
        Assert.Contains("no proven remedy: the rule set declares no adjustment that has a part in this rule", result.Output, StringComparison.Ordinal);
        Assert.Matches(@"margin -33\.5 % to \+33\.2 %", result.Output);
        Assert.Empty(result.Error);
    }

    [Theory]
    [InlineData("disconnection-tn:BK/3", 1)]
    [InlineData("disconnection-tn:BK/3", 3)]
    [InlineData("overload-capacity:BK/2", 1)]
    [InlineData("voltage-drop-lighting:BK/16", 1)]
    public void A_patch_applies_with_git_and_the_design_then_audits_as_promised(string key, int number)
    {
        using var folder = new GitRepository("examples/bakery");
        var before = File.ReadAllText(folder.File("bakery.design.yaml"));
        Tool.RunIn(folder.Path, ["audit", "bakery.design.yaml", "--quiet", "--write", "before.json"]);
        var made = Tool.RunIn(folder.Path, ["remedies", "bakery.design.yaml", key, "--number", $"{number}", "--quiet", "--write", "fix.patch"]);
        Assert.Equal((0, "", ""), (made.Code, made.Output, made.Error));
        Assert.Equal(before, File.ReadAllText(folder.File("bakery.design.yaml")));

        folder.Run("apply", "fix.patch");
        Tool.RunIn(folder.Path, ["audit", "bakery.design.yaml", "--quiet", "--write", "after.json"]);

        var (bad, left) = (Bad(folder.File("before.json")), Bad(folder.File("after.json")));
        Assert.Contains(key, bad);
        Assert.DoesNotContain(key, left);
        Assert.Empty(left.Except(bad));
        var after = File.ReadAllText(folder.File("bakery.design.yaml"));
        Assert.NotEqual(before, after);
        Assert.Equal(Comments(before), Comments(after));
    }

    [Theory]
    [InlineData("no-such-rule:BK/3", "fix.md")]
    [InlineData("overload-capacity:BK/4", "fix.md")]
    [InlineData("disconnection-tn:BK/3", "fix.docx")]
    [InlineData("disconnection-tn:BK/3", "fix.patch", "--number", "99")]
    [InlineData("breaking-capacity:OLD/1", "fix.patch")]
    public void What_cannot_be_done_exits_with_2_and_says_why(string key, string file, params string[] more)
    {
        using var folder = new TemporaryFolder();
        var result = Tool.Run(["remedies", Bakery, key, "--quiet", "--write", folder.File(file), .. more]);

        Assert.Equal(2, result.Code);
        Assert.NotEmpty(result.Error);
        Assert.False(File.Exists(folder.File(file)));
    }

    [Fact]
    public void A_patch_is_of_one_finding()
    {
        var result = Tool.Run("remedies", Bakery, "--write", "fix.patch");

        Assert.Equal(2, result.Code);
        Assert.Contains("patch-of-many", result.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void The_files_are_as_their_schemas_say_and_two_runs_write_the_same_bytes()
    {
        using var folder = new TemporaryFolder();
        folder.CopyFrom(Repository.PathOf("examples/bakery"));
        string[] files = ["remedies.json", "remedies.md"];
        string[] arguments = ["remedies", "bakery.design.yaml", "--quiet", .. files.SelectMany(file => new[] { "--write", file })];
        Tool.RunIn(folder.Path, arguments);
        var written = files.ToDictionary(file => file, file => File.ReadAllBytes(folder.File(file)));
        Tool.RunIn(folder.Path, arguments, ("LC_ALL", "de_DE.UTF-8"), ("DOTNET_PROCESSOR_COUNT", "1"));

        Assert.All(files, file => Assert.Equal(written[file], File.ReadAllBytes(folder.File(file))));
        AssertValid("remedies", File.ReadAllText(folder.File("remedies.json")));
        Assert.Contains("Electricity kills", File.ReadAllText(folder.File("remedies.md")), StringComparison.Ordinal);
    }

    [Fact]
    public void An_audit_tells_the_nearest_remedy_where_it_is_asked_to()
    {
        using var folder = new TemporaryFolder();
        folder.CopyFrom(Repository.PathOf("examples/bakery"));
        var result = Tool.RunIn(folder.Path, ["audit", "bakery.design.yaml", "--with-remedies", "--write", "a.json", "--write", "a.md", "--write", "a.txt"]);
        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("a.json")));
        var finding = json.RootElement.GetProperty("findings").EnumerateArray().Single(each => each.GetProperty("key").GetString() == "disconnection-tn:BK/3");

        Assert.Equal("device-curve", finding.GetProperty("remedy").GetProperty("changes")[0].GetProperty("adjustment").GetString());
        Assert.Contains("Nearest remedy: ", result.Output, StringComparison.Ordinal);
        Assert.Contains("- nearest remedy: type of the circuit-breaker of BK/3", File.ReadAllText(folder.File("a.md")), StringComparison.Ordinal);
        Assert.Contains("  remedy     type of the circuit-breaker of BK/3", File.ReadAllText(folder.File("a.txt")), StringComparison.Ordinal);
        AssertValid("findings", File.ReadAllText(folder.File("a.json")));
    }

    private static HashSet<string> Bad(string findings)
    {
        using var json = JsonDocument.Parse(File.ReadAllText(findings));
        return [.. json.RootElement.GetProperty("findings").EnumerateArray()
            .Where(finding => finding.GetProperty("verdict").GetString() == "nonconforming").Select(finding => finding.GetProperty("key").GetString()!)];
    }

    private static string[] Comments(string text) =>
        [.. text.Split('\n').Where(line => line.Contains('#', StringComparison.Ordinal)).Select(line => line[line.IndexOf('#', StringComparison.Ordinal)..])];

    private static void AssertValid(string name, string json)
    {
        var schema = Schema.Parse(new SourceText(name, File.ReadAllText(Repository.PathOf($"rules/schema/{name}.schema.json"))));
        var problems = new Problems();
        schema.Validate(YamlReader.Read(new SourceText(name + ".json", json), problems)!, problems);
        Assert.Equal("", ProblemText.Render(problems.All));
    }
}
