using System.Text.Json.Nodes;
using Auditor.Reports.Sarif;
using Auditor.Testing;
using Json.Schema;

namespace Auditor.Reports.Tests.Sarif;

/// <summary>SARIF files against the schema of the standard, by JsonSchema.Net, an independent validator.</summary>
public class SarifSchemaTests
{
    private static readonly JsonSchema Standard =
        JsonSchema.FromText(File.ReadAllText(Repository.PathOf("tests/Auditor.Reports.Tests/Sarif/sarif-2.1.0.schema.json")));

    private static readonly EvaluationOptions Strictly = new() { OutputFormat = OutputFormat.List, RequireFormatValidation = true };

    public static TheoryData<string> Examples => [.. ExampleAudit.All];

    [Theory]
    [MemberData(nameof(Examples))]
    public void Every_example_keeps_the_schema_of_the_standard(string example) => Assert.Empty(Faults(new SarifFile(ExampleAudit.Of(example)).Root));

    [Theory]
    [InlineData("garden")]
    [InlineData("hostile")]
    [InlineData("small")]
    public void Departures_hostile_texts_and_small_designs_keep_it(string design) => Assert.Empty(Faults(new SarifFile(Sheds.Audit(design)).Root));

    [Fact]
    public void A_comparison_keeps_it()
    {
        var baseline = new Dictionary<string, SarifBaseline>
        {
            ["device-known:A/3"] = SarifBaseline.Unchanged,
            ["run-sensible:A/2"] = SarifBaseline.Updated,
        };

        Assert.Empty(Faults(new SarifFile(Sheds.Audit("garden"), baseline).Root));
    }

    [Theory]
    [InlineData("level", "\"loud\"")]
    [InlineData("kind", "null")]
    [InlineData("ruleIndex", "-2")]
    [InlineData("somethingElse", "1")]
    public void The_schema_would_find_a_slip(string member, string value)
    {
        var file = new SarifFile(Sheds.Audit("garden"));
        file.Results[0][member] = JsonNode.Parse(value);

        Assert.NotEmpty(Faults(file.Root));
    }

    private static List<string> Faults(JsonNode file)
    {
        var outcome = Standard.Evaluate(file, Strictly);
        return outcome.IsValid ? [] : [.. outcome.Details.Where(detail => detail.HasErrors).Select(detail => $"{detail.InstanceLocation}: {string.Join(", ", detail.Errors!.Values)}"), "not valid"];
    }
}
