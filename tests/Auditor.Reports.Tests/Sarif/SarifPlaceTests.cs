using System.Security.Cryptography;
using System.Text;
using System.Text.Json.Nodes;
using Auditor.Reports.Sarif;
using Auditor.Testing;

namespace Auditor.Reports.Tests.Sarif;

public class SarifPlaceTests
{
    [Fact]
    public void The_region_of_a_result_holds_the_value_that_can_put_it_right()
    {
        var file = new SarifFile(Sheds.Audit("garden"));
        var place = file.Result("device-known:A/3")["locations"]![0]!["physicalLocation"]!;
        var region = place["region"]!;
        var line = File.ReadAllLines(Sheds.Data("designs/garden/circuits.yaml"))[Number(region["startLine"]) - 1];

        Assert.Equal("garden/circuits.yaml", Text(place["artifactLocation"]!["uri"]));
        Assert.Equal("DESIGN", Text(place["artifactLocation"]!["uriBaseId"]));
        Assert.Equal(Number(region["startLine"]), Number(region["endLine"]));
        Assert.Equal("BS 3036", line[(Number(region["startColumn"]) - 1)..(Number(region["endColumn"]) - 1)]);
        Assert.Equal(line, Text(place["contextRegion"]!["snippet"]!["text"]));
        Assert.Equal("utf16CodeUnits", Text(file.Run["columnKind"]));
    }

    [Fact]
    public void A_result_in_an_included_file_names_the_design_that_was_audited()
    {
        var file = new SarifFile(Sheds.Audit("garden"));

        Assert.Equal("garden.design.yaml", Text(file.Result("device-known:A/3")["analysisTarget"]!["uri"]));
        Assert.Null(file.Result("bonding-enough:bonding/water")["analysisTarget"]);
    }

    [Fact]
    public void Files_are_listed_with_their_hashes_and_results_lead_to_them()
    {
        var file = new SarifFile(Sheds.Audit("garden"));
        var artifacts = file.Run["artifacts"]!.AsArray();

        Assert.Equal(["garden.design.yaml", "garden/circuits.yaml"], artifacts.Select(artifact => Text(artifact!["location"]!["uri"])));
        Assert.All(artifacts, artifact => Assert.Equal(
            Convert.ToHexStringLower(SHA256.HashData(File.ReadAllBytes(Sheds.Data("designs/" + Text(artifact!["location"]!["uri"]))))),
            Text(artifact["hashes"]!["sha-256"])));
        Assert.All(file.Results.Select(result => result["locations"]![0]!["physicalLocation"]!["artifactLocation"]!), location =>
            Assert.Equal(Text(artifacts[Number(location["index"])]!["location"]!["uri"]), Text(location["uri"])));
    }

    [Fact]
    public void A_result_stands_in_the_tree_of_subjects()
    {
        var file = new SarifFile(Sheds.Audit("garden"));
        var subjects = file.Run["logicalLocations"]!.AsArray();
        var names = new List<string>();
        var place = file.Result("air-not-too-cold:A/2/leg 2")["locations"]![0]!["logicalLocations"]![0]!;
        for (int? at = Number(place["index"]); at is { } index; at = subjects[index]!["parentIndex"]?.GetValue<int>())
        {
            names.Add(Text(subjects[index]!["fullyQualifiedName"]));
        }

        Assert.Equal("A/2/leg 2", Text(place["fullyQualifiedName"]));
        Assert.Equal("leg", Text(place["kind"]));
        Assert.Equal(["A/2/leg 2", "A/2", "A", "-"], names);
    }

    [Fact]
    public void An_assumption_is_shown_where_it_stands()
    {
        using var folder = new TemporaryFolder();
        var design = File.ReadAllText(Sheds.Data("designs/hostile.design.yaml")).Replace("12 m, assumed", "120 m, assumed", StringComparison.Ordinal);
        var file = new SarifFile(ExampleAudit.At(folder.Write("a.design.yaml", design), "a.design.yaml", Sheds.Rules));
        var place = Assert.Single(file.Result("run-sensible:A|B/`1`")["relatedLocations"]!.AsArray())!;

        Assert.Equal("Assumed: A|B/`1`/leg 1 length: 120 m, assumed", Text(place["message"]!["text"]));
        Assert.Equal(17, Number(place["physicalLocation"]!["region"]!["startLine"]));
        Assert.Null(file.Result("load-within-capacity:A|B/`1`")["relatedLocations"]);
    }

    [Fact]
    public void Names_of_files_are_written_as_addresses_ask()
    {
        using var folder = new TemporaryFolder();
        var path = folder.Write("shed no. 7#α.design.yaml", File.ReadAllText(Sheds.Data("designs/hostile.design.yaml")));
        var file = new SarifFile(ExampleAudit.At(path, "jobs/shed no. 7#α.design.yaml", Sheds.Rules));

        Assert.Equal("shed%20no.%207%23%CE%B1.design.yaml", Text(file.Run["artifacts"]![0]!["location"]!["uri"]));
    }

    [Fact]
    public void No_place_of_the_machine_and_no_moment_is_told()
    {
        var first = SarifReport.Write(ExampleAudit.Of("workshop/workshop.design.yaml"));
        var text = Encoding.UTF8.GetString(first);

        Assert.DoesNotContain(Repository.Root, text, StringComparison.Ordinal);
        Assert.DoesNotContain("Utc\"", text, StringComparison.Ordinal);
        Assert.DoesNotContain("\r", text, StringComparison.Ordinal);
        Assert.EndsWith("}\n", text, StringComparison.Ordinal);
        Assert.Equal(first, SarifReport.Write(ExampleAudit.At(Repository.PathOf("examples/workshop/workshop.design.yaml"), "elsewhere/workshop.design.yaml", ExampleAudit.Rules)));
    }

    private static string Text(JsonNode? node) => node!.GetValue<string>();

    private static int Number(JsonNode? node) => node!.GetValue<int>();
}
