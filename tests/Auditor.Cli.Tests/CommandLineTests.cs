using System.Text.Json;
using Auditor.Testing;

namespace Auditor.Cli.Tests;

public class CommandLineTests
{
    private const string OneCircuit = "examples/one-circuit/one-circuit.design.yaml";
    private const string Bakery = "examples/bakery/bakery.design.yaml";

    [Fact]
    public void The_bakery_has_findings_that_need_action()
    {
        var result = Tool.Run("audit", Bakery);

        Assert.Equal(1, result.Code);
        Assert.Contains("Requirements not met", result.Output, StringComparison.Ordinal);
        Assert.Contains("Electricity kills", result.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("\u001b", result.Output, StringComparison.Ordinal);
        Assert.Empty(result.Error);
    }

    [Theory]
    [InlineData("audit")]
    [InlineData("audit", Bakery, "--no-such-option")]
    [InlineData("no-such-command")]
    [InlineData("audit", "examples/none.design.yaml")]
    [InlineData("audit", "rules/schema")]
    [InlineData("audit", Bakery, "--rules", "no-such-set")]
    [InlineData("audit", Bakery, "--as-of", "2026-02-30")]
    [InlineData("audit", Bakery, "--write", "report.docx")]
    [InlineData("audit", "examples", "--write", "report.md")]
    [InlineData("evidence", Bakery, "no-such-rule:BK/1")]
    [InlineData("rules", "show", "no-such-rule")]
    [InlineData("schema", "no-such-schema")]
    public void What_cannot_be_done_exits_with_2_and_says_why(params string[] arguments)
    {
        var result = Tool.Run(arguments);

        Assert.Equal(2, result.Code);
        Assert.NotEmpty(result.Error);
    }

    [Fact]
    public void Quiet_prints_nothing_and_keeps_the_exit_code()
    {
        var result = Tool.Run("audit", Bakery, "--quiet");

        Assert.Equal(1, result.Code);
        Assert.Empty(result.Output);
    }

    [Fact]
    public void The_threshold_decides_the_exit_code()
    {
        using var folder = new TemporaryFolder();
        var design = File.ReadAllText(Repository.PathOf(OneCircuit));
        File.WriteAllText(folder.File("a.design.yaml"), design);
        Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--quiet", "--write", "a.json"]);
        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("a.json")));
        var required = json.RootElement.GetProperty("rules").EnumerateArray()
            .Where(rule => rule.GetProperty("provision").GetString() == "requirement").Select(rule => rule.GetProperty("id").GetString()).ToHashSet();
        var undetermined = json.RootElement.GetProperty("findings").EnumerateArray()
            .Any(finding => finding.GetProperty("verdict").GetString() == "undetermined" && required.Contains(finding.GetProperty("rule").GetString()));

        Assert.Equal(0, json.RootElement.GetProperty("counts").GetProperty("nonconforming").GetInt32());
        Assert.True(undetermined);
        Assert.Equal(0, Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--quiet", "--fail-on", "nonconforming"]).Code);
        Assert.Equal(1, Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--quiet"]).Code);
    }

    [Fact]
    public void A_voltage_drop_finding_is_derived_down_to_lines_and_cells()
    {
        var result = Tool.Run("evidence", Bakery, "voltage-drop-lighting:BK/16");

        Assert.Equal(0, result.Code);
        Assert.Matches(@"design: BK/16/leg 1 length = \S+ m +\[examples/bakery/bakery\.design\.yaml:\d+:\d+\]", result.Output);
        Assert.Matches(@"table: .*row .* = .* mV/A/m +\[rules/tables/voltage-drop/.*\.yaml:\d+\]", result.Output);
        Assert.Contains("parameter: param.voltage_drop_lighting = 3 %", result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_quantity_can_be_asked_for_by_subject_and_symbol()
    {
        var result = Tool.Run("evidence", OneCircuit, "GO/1", "R1R2");

        // 18 m of 2.5/1.5 mm² flat twin and earth at 19.51 mΩ/m (common practice) are 0.3512 Ω.
        Assert.StartsWith("GO/1 R1R2 = 0.3512 Ω", result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void Help_shows_the_commands_and_examples()
    {
        var result = Tool.Run("audit", "--help");

        Assert.Equal(0, result.Code);
        Assert.Contains("auditor audit examples/bakery/bakery.design.yaml", result.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_schema_is_printed_as_it_stands()
    {
        var result = Tool.Run("schema", "design");

        Assert.Equal(File.ReadAllText(Repository.PathOf("rules/schema/design.schema.json")), result.Output);
    }

    [Fact]
    public void The_list_of_rules_names_the_file_of_each()
    {
        var result = Tool.Run("rules", "list");

        Assert.Matches(@"disconnection-tn +circuit +requirement +automatic disconnection +rules/provisions/\S+/disconnection-tn\.yaml", result.Output);
        Assert.Matches(@"param cmin +0\.95 +rules/sets/\S+\.yaml:\d+:\d+", result.Output);
    }
}
