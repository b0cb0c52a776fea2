using System.Text.Json.Nodes;
using Auditor.Reports.Sarif;

namespace Auditor.Reports.Tests.Sarif;

public class SarifResultTests
{
    private static readonly SarifFile Garden = new(Sheds.Audit("garden"));

    [Fact]
    public void What_conforms_is_no_result() =>
        Assert.Equal(
            ["bonding-enough:bonding/water", "load-within-capacity:A/2", "run-sensible:A/2", "air-not-too-cold:A/2/leg 2", "device-known:A/3", "load-within-capacity:A/4", "run-sensible:A/4",
                "record-departure-needed:departure/run-sensible:A/1", "record-departure-permitted:departure/device-known:A/3",
                "record-departure-in-date:departure/load-within-capacity:A/2", "record-departure-matched:departure/no-such-rule:A/9"],
            Garden.Results.Select(SarifFile.Fingerprint));

    [Theory]
    [InlineData("device-known:A/3", "fail", "error")]
    [InlineData("run-sensible:A/2", "fail", "warning")]
    [InlineData("load-within-capacity:A/4", "open", "none")]
    [InlineData("run-sensible:A/4", "open", "none")]
    [InlineData("bonding-enough:bonding/water", "fail", "error")]
    public void Kind_follows_the_verdict_and_level_the_provision(string key, string kind, string level)
    {
        Assert.Equal(kind, Text(Garden.Result(key)["kind"]));
        Assert.Equal(level, Text(Garden.Result(key)["level"]));
    }

    [Fact]
    public void The_index_of_each_result_leads_to_its_rule() =>
        Assert.All(Garden.Results, result => Assert.Equal(Text(result["ruleId"]), Text(Garden.Rules[result["ruleIndex"]!.GetValue<int>()]!["id"])));

    [Fact]
    public void Rules_that_found_nothing_wrong_are_listed_since_they_were_applied()
    {
        Assert.Contains("terminal-there", Garden.Rules.Select(rule => Text(rule!["id"])));
        Assert.DoesNotContain("bonding-enough", new SarifFile(Sheds.Audit("small")).Rules.Select(rule => Text(rule!["id"])));
    }

    [Fact]
    public void A_rule_tells_what_why_and_by_which_clause()
    {
        var rule = Garden.Rules.Single(rule => Text(rule!["id"]) == "load-within-capacity")!;

        Assert.Equal("LoadWithinCapacity", Text(rule["name"]));
        Assert.Equal("The conductors carry the load.", Text(rule["shortDescription"]!["text"]));
        Assert.Equal("A conductor that carries more than it can grows hot.", Text(rule["fullDescription"]!["text"]));
        Assert.Equal("error", Text(rule["defaultConfiguration"]!["level"]));
        Assert.Equal("overload", Text(rule["properties"]!["clauseType"]));
        Assert.Equal(["Shed rule 1", "Shed rule 1.2"], rule["properties"]!["references"]!.AsArray().Select(Text));
        Assert.Equal(
            """
            **The conductors carry the load**

            A conductor that carries more than it can grows hot.

            - requirement, overload: Shed rule 1, Shed rule 1.2 (common practice)
            - can be put right by: `cable.csa`, `load.current`
            - rule: `load-within-capacity`
            """.ReplaceLineEndings("\n"),
            Text(rule["help"]!["markdown"]));
        Assert.Null(rule["helpUri"]);
    }

    [Fact]
    public void A_departure_in_force_suppresses_with_its_reason()
    {
        var suppression = Assert.Single(Garden.Result("bonding-enough:bonding/water")["suppressions"]!.AsArray())!;

        Assert.Equal("inSource", Text(suppression["kind"]));
        Assert.Equal("accepted", Text(suppression["status"]));
        Assert.Equal("The pipe is of plastic behind the wall.", Text(suppression["justification"]));
        Assert.Equal(18, suppression["location"]!["physicalLocation"]!["region"]!["startLine"]!.GetValue<int>());
        Assert.Equal("2027-03-01", Text(suppression["properties"]!["until"]));
    }

    [Theory]
    [InlineData("device-known:A/3")]
    [InlineData("load-within-capacity:A/2")]
    public void A_departure_that_is_refused_or_expired_suppresses_nothing(string key) => Assert.Empty(Garden.Result(key)["suppressions"]!.AsArray());

    [Fact]
    public void A_message_names_the_subject_and_what_is_missing()
    {
        Assert.Equal("A/3 Kiln: The device is of BS 3036; allowed are EN 60898, EN 61009.", Text(Garden.Result("device-known:A/3")["message"]!["text"]));
        Assert.StartsWith("A/4 Bench: cannot be judged, as A/4/leg 1: `length` is not given.", Text(Garden.Result("run-sensible:A/4")["message"]!["text"]), StringComparison.Ordinal);
    }

    [Fact]
    public void Braces_in_a_text_are_no_placeholders()
    {
        using var folder = new TemporaryFolder();
        var design = File.ReadAllText(Sheds.Data("designs/hostile.design.yaml")).Replace("![x](http://evil.example/x.png)", "Lamp {0}", StringComparison.Ordinal);
        var file = new SarifFile(ExampleAudit.At(folder.Write("braces.design.yaml", design), "braces.design.yaml", Sheds.Rules));

        Assert.Contains("Lamp {{0}}: ", Text(file.Result("load-within-capacity:A|B/`1`")["message"]!["text"]), StringComparison.Ordinal);
    }

    [Fact]
    public void Without_a_comparison_no_result_has_a_state() => Assert.All(Garden.Results, result => Assert.Null(result["baselineState"]));

    [Fact]
    public void With_a_comparison_each_result_has_its_state_and_one_unheard_of_is_new()
    {
        var file = new SarifFile(Sheds.Audit("garden"), new Dictionary<string, SarifBaseline>
        {
            ["device-known:A/3"] = SarifBaseline.Unchanged,
            ["run-sensible:A/2"] = SarifBaseline.Updated,
        });

        Assert.Equal(["new", "new", "updated", "new", "unchanged", "new", "new", "new", "new", "new", "new"], file.Results.Select(result => Text(result["baselineState"])));
    }

    private static string Text(JsonNode? node) => node!.GetValue<string>();
}
