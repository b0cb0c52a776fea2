using System.Text.Json;
using Auditor.Documents;
using Auditor.Testing;

namespace Auditor.Cli.Tests;

public class LimitsCommandTests
{
    private const string OneCircuit = "examples/one-circuit/one-circuit.design.yaml";
    private const string Workshop = "examples/workshop/workshop.design.yaml";

    [Fact]
    public void The_table_names_each_input_and_the_rule_that_governs_it()
    {
        var result = Tool.Run("limits", OneCircuit, "--input", "cable.length");

        Assert.Equal(0, result.Code);
        Assert.StartsWith("GO/1 ", result.Output, StringComparison.Ordinal);
        Assert.Matches(@"cable\.length\s+18 m\s+\S+ m\s+[a-z-]+", result.Output);
        Assert.Empty(result.Error);
    }

    [Fact]
    public void A_board_stands_for_its_circuits()
    {
        var board = Tool.Run("limits", Workshop, "--subject", "MSB", "--input", "cable.length");
        var circuit = Tool.Run("limits", Workshop, "--subject", "MSB/1", "--input", "cable.length");

        Assert.Contains(circuit.Output, board.Output, StringComparison.Ordinal);
        Assert.True(board.Output.Length > circuit.Output.Length);
    }

    [Theory]
    [InlineData("--subject", "MSB/99")]
    [InlineData("--input", "cable.lenght")]
    [InlineData("--write", "limits.docx")]
    [InlineData("--rules", "no-such-set")]
    public void What_cannot_be_done_exits_with_2_and_says_why(string option, string value)
    {
        var result = Tool.Run("limits", Workshop, option, value);

        Assert.Equal(2, result.Code);
        Assert.NotEmpty(result.Error);
        Assert.Empty(result.Output);
    }

    [Fact]
    public void The_files_hold_what_their_formats_ask_for_and_two_runs_write_the_same_bytes()
    {
        using var folder = new TemporaryFolder();
        folder.CopyFrom(Repository.PathOf("examples/workshop"));
        string[] files = ["limits.json", "limits.md", "limits.csv"];
        string[] arguments = ["limits", "workshop.design.yaml", "--quiet", .. files.SelectMany(file => new[] { "--write", file })];
        var first = Tool.RunIn(folder.Path, arguments);
        var written = files.ToDictionary(file => file, file => File.ReadAllBytes(folder.File(file)));
        Tool.RunIn(folder.Path, arguments, ("LC_ALL", "de_DE.UTF-8"), ("DOTNET_PROCESSOR_COUNT", "1"));

        Assert.Equal((0, ""), (first.Code, first.Output));
        Assert.All(files, file => Assert.Equal(written[file], File.ReadAllBytes(folder.File(file))));
        AssertValid(File.ReadAllText(folder.File("limits.json")));
        Assert.Contains("Electricity kills", File.ReadAllText(folder.File("limits.md")), StringComparison.Ordinal);
        Assert.Contains("## For the site", File.ReadAllText(folder.File("limits.md")), StringComparison.Ordinal);
        Assert.All(File.ReadAllText(folder.File("limits.csv")).TrimEnd().Split("\r\n"), line => Assert.True(line.Count(c => c == ',') >= 13, line));
    }

    [Fact]
    public void A_limit_in_the_file_bears_the_rule_that_sets_it()
    {
        using var folder = new TemporaryFolder();
        folder.CopyFrom(Repository.PathOf("examples/one-circuit"));
        Tool.RunIn(folder.Path, ["limits", "one-circuit.design.yaml", "--quiet", "--write", "a.json"]);
        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("a.json")));
        var length = json.RootElement.GetProperty("limits").EnumerateArray().Single(limit => limit.GetProperty("input").GetString() == "cable.length");
        var most = length.GetProperty("around").GetProperty("most");
        var rule = length.GetProperty("rules").EnumerateArray().Single(each => each.GetProperty("rule").GetString() == "voltage-drop-other");

        // 18 mV/A/m for 2.5 mm² (common practice): 11.5 V, 5 % of 230 V, are used up by 12 A over 53.24 m.
        Assert.Equal(53.24, rule.GetProperty("kept")[0].GetProperty("most").GetProperty("value").GetDouble(), 0.01);
        Assert.Equal("voltage-drop-other", most.GetProperty("rule").GetString());
    }

    [Fact]
    public void Guarded_acceptance_is_asked_for_on_the_command_line_or_in_the_design()
    {
        using var folder = new TemporaryFolder();
        var text = File.ReadAllText(Repository.PathOf(OneCircuit)).Replace("18 m", "45 m ± 20 %", StringComparison.Ordinal);
        File.WriteAllText(folder.File("a.design.yaml"), text);
        var simple = Tool.RunIn(folder.Path, ["audit", "a.design.yaml"]);
        var guarded = Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--decision", "guarded", "--write", "a.json", "--sample", "500"]);
        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("a.json")));
        var finding = json.RootElement.GetProperty("findings").EnumerateArray().Single(each => each.GetProperty("key").GetString() == "voltage-drop-other:GO/1");

        File.WriteAllText(folder.File("b.design.yaml"), text.Replace("basis: { ", "basis: { decision: guarded, ", StringComparison.Ordinal));
        var asked = Tool.RunIn(folder.Path, ["audit", "b.design.yaml"]);

        Assert.Contains("met as stated, but not everywhere within the tolerances", asked.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("within the tolerances", simple.Output, StringComparison.Ordinal);
        Assert.Contains("met as stated, but not everywhere within the tolerances", guarded.Output, StringComparison.Ordinal);
        Assert.Equal("guarded", json.RootElement.GetProperty("basis").GetProperty("decision").GetString());
        Assert.Equal("unproven", finding.GetProperty("verdict").GetString());
        Assert.True(finding.GetProperty("margin").GetProperty("worstCase").GetDouble() < 0);
        Assert.Equal(500, finding.GetProperty("withinTolerances").GetProperty("samples").GetProperty("drawn").GetInt32());
    }

    private static void AssertValid(string json)
    {
        var schema = Schema.Parse(new SourceText("limits.schema.json", File.ReadAllText(Repository.PathOf("rules/schema/limits.schema.json"))));
        var problems = new Problems();
        schema.Validate(YamlReader.Read(new SourceText("limits.json", json), problems)!, problems);
        Assert.Equal("", ProblemText.Render(problems.All));
    }
}
