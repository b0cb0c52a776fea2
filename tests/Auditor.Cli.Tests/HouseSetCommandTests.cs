using System.Text.Json;
using Auditor.Testing;

namespace Auditor.Cli.Tests;

/// <summary>The house rules of a firm in a folder of its own, as the commands read and tell them.</summary>
public class HouseSetCommandTests
{
    private const string Quillmere = "examples/quillmere/house/quillmere.set.yaml";
    private const string Loosened = "House rules ask for less than united-kingdom";

    private static readonly string[] Reports = ["a.html", "a.md", "a.txt", "a.json", "a.sarif", "a.xml", "a.csv"];

    [Fact]
    public void A_house_set_that_loosens_a_limit_is_told_on_in_every_format_and_on_the_terminal()
    {
        using var folder = Folder("parameters: { voltage-drop-other: { value: 6 % } }\n");

        var result = Audit(folder);

        Assert.Equal(1, result.Code);
        Assert.Contains(Loosened, result.Output, StringComparison.Ordinal);
        Assert.Contains("[record-house-set-not-looser]", result.Output, StringComparison.Ordinal);
        Assert.All(Reports, report => Assert.Contains("parameter voltage-drop-other from 5 % to 6 %", Text(folder, report), StringComparison.Ordinal));
        Assert.Equal(["change/parameter voltage-drop-other nonconforming house/firm.yaml:4"], Changes(folder));
    }

    [Fact]
    public void What_is_loosened_stays_told_when_somebody_has_agreed_to_it()
    {
        using var folder = Folder("parameters: { voltage-drop-other: { value: 6 % } }\n");
        File.AppendAllText(
            folder.File("a.design.yaml"),
            "departures:\n  - { rule: record-house-set-not-looser, subject: change/parameter voltage-drop-other, reason: Heaters only., agreed-by: T. Example, date: 2026-03-01 }\n");

        var result = Audit(folder);

        Assert.Equal(0, result.Code);
        Assert.Contains(Loosened, result.Output, StringComparison.Ordinal);
        Assert.All(Reports, report => Assert.Contains("parameter voltage-drop-other from 5 % to 6 %", Text(folder, report), StringComparison.Ordinal));
        Assert.Equal(["change/parameter voltage-drop-other departed house/firm.yaml:4"], Changes(folder));
    }

    [Fact]
    public void A_house_set_that_tightens_is_not_told_on()
    {
        using var folder = Folder("parameters: { voltage-drop-other: { value: 4 % } }\nchanges:\n  - { rule: spare-ways, provision: requirement, reason: The firm. }\n");

        var result = Audit(folder);

        Assert.Equal(0, result.Code);
        Assert.DoesNotContain("record-house-set-not-looser", result.Output, StringComparison.Ordinal);
        Assert.All(Reports, report => Assert.DoesNotContain(Loosened, Text(folder, report), StringComparison.Ordinal));
        Assert.All(Changes(folder), change => Assert.Contains(" conforms ", change, StringComparison.Ordinal));
        Assert.DoesNotContain("change/", Text(folder, "a.csv"), StringComparison.Ordinal);
    }

    [Fact]
    public void What_a_set_that_the_caller_names_warns_of_is_told()
    {
        using var folder = Folder("changes:\n  - { rule: spare-ways, provision: recommendation, reason: The firm. }\n");

        var result = Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--rules", "house/firm.yaml", "--quiet", "--fail-on", "nonconforming"]);

        Assert.Equal(0, result.Code);
        Assert.Contains("warning change-of-nothing", result.Error, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("  - { rule: voltage-drop-other, provision: recommendation, reason: None. }", "change/provision voltage-drop-other")]
    [InlineData("  - { rule: voltage-drop-other, dropped: true, reason: None. }", "change/rule voltage-drop-other")]
    [InlineData("  - { rule: polarity, departures: allowed, reason: None. }", "change/departures polarity")]
    public void A_rule_that_is_lowered_dropped_or_opened_to_departures_is_told_on(string change, string key)
    {
        using var folder = Folder($"changes:\n{change}\n");

        var result = Audit(folder);

        Assert.Equal(1, result.Code);
        Assert.Contains(Loosened, result.Output, StringComparison.Ordinal);
        Assert.Equal([$"{key} nonconforming house/firm.yaml:5"], Changes(folder));
    }

    [Fact]
    public void A_template_that_hides_what_is_loosened_is_refused()
    {
        using var folder = Folder("templates: { md: own.scriban-md }\nparameters: { voltage-drop-other: { value: 6 % } }\n");
        File.WriteAllText(folder.File("house/own.scriban-md"), "{{ report.caution }}\n");

        var hidden = Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--quiet", "--write", "a.md"]);
        File.WriteAllText(folder.File("house/own.scriban-md"), "Own report. {{ report.caution }} {{ report.rule_set.loosened }}\n");
        var shown = Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--quiet", "--write", "a.md"]);

        Assert.Equal(2, hidden.Code);
        Assert.Contains("house/own.scriban-md:1:1: error template-without-loosened", hidden.Error, StringComparison.Ordinal);
        Assert.Equal(1, shown.Code);
        Assert.StartsWith("Own report.", Text(folder, "a.md"), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("DB1", "01", 0)]
    [InlineData("GO", "01", 1)]
    [InlineData("DB1", "1", 1)]
    public void A_naming_pattern_judges_ids(string board, string circuit, int code)
    {
        using var folder = Folder("uses: { provisions: [rules] }\n");
        folder.CopyFrom(Repository.PathOf("examples/quillmere/house/rules"), "taken");
        Directory.CreateDirectory(folder.File("house/rules"));
        foreach (var rule in new[] { "board-numbered.yaml", "circuit-numbered.yaml" })
        {
            File.Copy(folder.File("taken/" + rule), folder.File("house/rules/" + rule));
        }

        var design = folder.File("a.design.yaml");
        File.WriteAllText(design, File.ReadAllText(design).Replace("id: GO\n", $"id: {board}\n", StringComparison.Ordinal).Replace("- id: 1\n", $"- id: \"{circuit}\"\n", StringComparison.Ordinal));

        Assert.Equal(code, Audit(folder).Code);
    }

    [Fact]
    public void The_house_set_of_the_example_is_checked_listed_shown_and_tested_with_its_own_files()
    {
        var check = Tool.Run("rules", "check", "--rules", Quillmere);
        var list = Tool.Run("rules", "list", "--rules", Quillmere);
        var show = Tool.Run("rules", "show", "spare-ways", "--rules", Quillmere);
        var test = Tool.Run("rules", "test", "--mutate", "--rules", Quillmere);

        Assert.Equal((0, 0, 0, 0), (check.Code, list.Code, show.Code, test.Code));
        Assert.Matches(@"(?m)^loop-margin .* examples/quillmere/house/rules/loop-margin\.yaml$", list.Output);
        Assert.Matches(@"(?m)^disconnection-tn .* rules/provisions/shock-protection/disconnection-tn\.yaml$", list.Output);
        Assert.Matches(@"(?m)^param spare-ways-share +30 % +examples/quillmere/house/quillmere\.set\.yaml:\d+:\d+$", list.Output);
        Assert.Matches(@"(?m)^table stock-csa +examples/quillmere/house/tables/stock\.yaml$", list.Output);
        Assert.Matches(@"(?m)^quantity circuit +loop_margin +examples/quillmere/house/sheets/margins\.yaml$", list.Output);
        Assert.Matches(@"(?m)^template \.md +examples/quillmere/house/templates/report\.scriban-md$", list.Output);
        Assert.Matches(@"(?m)^loosened  parameter phase-imbalance: 10 % → 15 %", list.Output);
        Assert.Contains("changed       provision from recommendation to requirement by quillmere", show.Output, StringComparison.Ordinal);
        Assert.Contains(" 0 failed", test.Output, StringComparison.Ordinal);
        Assert.Contains("0 noticed by no case", test.Output, StringComparison.Ordinal);
    }

    [Fact]
    public void A_case_of_a_house_rule_that_fails_and_a_mutation_that_survives_are_told_with_their_place()
    {
        using var folder = new TemporaryFolder();
        folder.CopyFrom(Repository.PathOf("examples/quillmere/house"), "house");
        var rule = folder.File("house/rules/loop-margin.yaml");
        var text = File.ReadAllText(rule);
        var start = text.IndexOf("  - name: just less", StringComparison.Ordinal);

        File.WriteAllText(rule, text[..start]);
        var thin = Tool.RunIn(folder.Path, ["rules", "test", "--mutate", "--rules", "house/quillmere.set.yaml"]);
        File.WriteAllText(rule, text.Replace("Zs: 0.8 ohm", "Zs: 0.99 ohm", StringComparison.Ordinal));
        var failing = Tool.RunIn(folder.Path, ["rules", "test", "--rules", "house/quillmere.set.yaml"]);

        Assert.Equal((1, 1), (thin.Code, failing.Code));
        Assert.Contains("house/rules/loop-margin.yaml:", thin.Output, StringComparison.Ordinal);
        Assert.DoesNotContain("rules/sheets/", thin.Output, StringComparison.Ordinal);
        Assert.Contains("loop-margin, case \"room enough\"", failing.Output, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("rule-set: /etc/passwd.yaml", "rule-set-outside")]
    [InlineData("rule-set: ../firm.yaml", "rule-set-outside")]
    [InlineData("rule-set: linked/firm.yaml", "rule-set-outside")]
    [InlineData("rule-set: linked.yaml", "rule-set-outside")]
    [InlineData("rule-set: house/up.yaml", "extends-outside-folder")]
    [InlineData("rule-set: house/uses.yaml", "rules-outside-folder")]
    [InlineData("rule-set: house/schedule.yaml", "schedule-linked")]
    public void A_set_of_a_design_reads_nothing_outside_its_folder(string line, string code)
    {
        const string Secret = "a secret of the machine";
        using var outside = new TemporaryFolder();
        File.WriteAllText(outside.File("firm.yaml"), Secret);
        using var folder = Folder("");
        Directory.CreateSymbolicLink(folder.File("linked"), outside.Path);
        File.CreateSymbolicLink(folder.File("linked.yaml"), outside.File("firm.yaml"));
        File.CreateSymbolicLink(folder.File("house/linked.yaml"), outside.File("firm.yaml"));
        Directory.CreateDirectory(folder.File("house/templates"));
        File.WriteAllText(folder.File("house/templates/a.scriban-md"), "{{ report.caution }}");
        File.CreateSymbolicLink(folder.File("house/templates/schedule.yaml"), outside.File("firm.yaml"));
        File.WriteAllText(folder.File("house/up.yaml"), "set: up\ntitle: Up\nextends: ../../firm.yaml\n");
        File.WriteAllText(folder.File("house/uses.yaml"), "set: uses\ntitle: Uses\nextends: united-kingdom\nuses: { provisions: [linked.yaml] }\n");
        File.WriteAllText(folder.File("house/schedule.yaml"), "set: schedule\ntitle: Schedule\nextends: united-kingdom\ntemplates: { md: templates/a.scriban-md }\n");
        var design = folder.File("a.design.yaml");
        File.WriteAllText(design, File.ReadAllText(design).Replace("rule-set: house/firm.yaml", line, StringComparison.Ordinal));

        var result = Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--write", "a.md"]);

        Assert.Equal(2, result.Code);
        Assert.Contains($"error {code}", result.Error, StringComparison.Ordinal);
        Assert.DoesNotContain(Secret, result.Error + result.Output, StringComparison.Ordinal);
        Assert.False(File.Exists(folder.File("a.md")));
    }

    [Fact]
    public void The_rules_of_a_design_come_from_where_it_lies_and_not_from_where_the_program_runs()
    {
        using var folder = Folder("parameters: { voltage-drop-other: { value: 4 % } }\n");
        using var elsewhere = new TemporaryFolder();

        var here = Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--quiet", "--write", "here.json"]);
        var there = Tool.RunIn(elsewhere.Path, ["audit", folder.File("a.design.yaml"), "--quiet", "--write", folder.File("there.json")]);

        Assert.Equal(here.Code, there.Code);
        Assert.Equal(Text(folder, "here.json"), Text(folder, "there.json"));
    }

    [Fact]
    public void A_comparison_lays_what_is_loosened_at_the_door_of_the_rule_set()
    {
        using var folder = Folder("parameters: { voltage-drop-other: { value: 4 % } }\n");
        Tool.RunIn(folder.Path, ["audit", "a.design.yaml", "--quiet", "--write", "before.json"]);
        var set = folder.File("house/firm.yaml");
        File.WriteAllText(set, File.ReadAllText(set).Replace("4 %", "6 %", StringComparison.Ordinal));

        var result = Tool.RunIn(folder.Path, ["compare", "before.json", "a.design.yaml", "--fail-on", "nonconforming"]);

        Assert.Equal(1, result.Code);
        Assert.Matches(@"record-house-set-not-looser:change/parameter voltage-drop-other +conforms +nonconforming +rule set", result.Output);
        Assert.DoesNotContain("Subjects that came", result.Output, StringComparison.Ordinal);
    }

    private static TemporaryFolder Folder(string lines)
    {
        var folder = new TemporaryFolder();
        Directory.CreateDirectory(folder.File("house"));
        File.WriteAllText(folder.File("house/firm.yaml"), "set: firm\ntitle: House rules of a firm\nextends: united-kingdom\n" + lines);
        var design = File.ReadAllText(Repository.PathOf("examples/one-circuit/one-circuit.design.yaml"));
        File.WriteAllText(folder.File("a.design.yaml"), design.Replace("rule-set: united-kingdom", "rule-set: house/firm.yaml", StringComparison.Ordinal));
        return folder;
    }

    private static ToolResult Audit(TemporaryFolder folder) => Tool.RunIn(
        folder.Path, ["audit", "a.design.yaml", "--as-of", "2026-12-01", "--fail-on", "nonconforming", .. Reports.SelectMany(report => new[] { "--write", report })]);

    /// <summary>A report without its line breaks, which the plain text puts where the page ends.</summary>
    private static string Text(TemporaryFolder folder, string report) =>
        string.Join(' ', File.ReadAllText(folder.File(report)).Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries));

    private static string[] Changes(TemporaryFolder folder)
    {
        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("a.json")));
        return [.. json.RootElement.GetProperty("findings").EnumerateArray()
            .Where(finding => finding.GetProperty("rule").GetString() == "record-house-set-not-looser")
            .Select(finding => $"{finding.GetProperty("subject").GetString()} {finding.GetProperty("verdict").GetString()} "
                + $"{finding.GetProperty("location").GetProperty("file").GetString()}:{finding.GetProperty("location").GetProperty("line").GetInt32()}")];
    }
}
