using System.Text.Json.Nodes;

namespace Auditor.Reports.Tests.Sarif;

public class SarifFingerprintTests
{
    [Fact]
    public void Fingerprints_stay_when_lines_move()
    {
        using var folder = new TemporaryFolder();
        var design = File.ReadAllText(Sheds.Data("designs/hostile.design.yaml"));
        var before = new SarifFile(ExampleAudit.At(folder.Write("a.design.yaml", design), "a.design.yaml", Sheds.Rules));
        var after = new SarifFile(ExampleAudit.At(folder.Write("a.design.yaml", "# one\n\n# three\n" + design), "a.design.yaml", Sheds.Rules));

        Assert.NotEmpty(before.Results);
        Assert.Equal(before.Results.Select(SarifFile.Fingerprint), after.Results.Select(SarifFile.Fingerprint));
        Assert.Equal(Lines(before).Select(line => line + 3), Lines(after));
    }

    [Fact]
    public void No_two_results_share_a_fingerprint()
    {
        var all = new SarifFile(ExampleAudit.Of("workshop/workshop.design.yaml")).Results.Select(SarifFile.Fingerprint).ToArray();

        Assert.NotEmpty(all);
        Assert.Equal(all.Length, all.Distinct().Count());
    }

    private static IEnumerable<int> Lines(SarifFile file) =>
        file.Results.Select(result => ((JsonNode)result["locations"]![0]!["physicalLocation"]!["region"]!["startLine"]!).GetValue<int>());
}
