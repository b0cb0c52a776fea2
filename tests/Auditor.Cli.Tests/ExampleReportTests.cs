using Auditor.Testing;

namespace Auditor.Cli.Tests;

/// <summary>The reports beside the examples are what the program writes, on any machine.</summary>
public class ExampleReportTests
{
    private static readonly string[] Writes = ["--write", "{name}.findings.json", "--write", "{name}.report.md", "--write", "{name}.report.txt"];

    public static TheoryData<string> Examples =>
        [.. Directory.EnumerateFiles(Repository.PathOf("examples"), "*.design.yaml", SearchOption.AllDirectories)
            .Select(file => Path.GetRelativePath(Repository.PathOf("examples"), file)).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Examples))]
    public void Committed_reports_are_up_to_date_byte_for_byte(string design)
    {
        using var folder = new TemporaryFolder();
        folder.CopyFrom(Repository.PathOf("examples/" + Path.GetDirectoryName(design)));
        var name = Path.GetFileName(design)[..^".design.yaml".Length];
        string[] reports = [name + ".findings.json", name + ".report.md", name + ".report.txt"];
        Array.ForEach(reports, report => File.Delete(folder.File(report)));

        var result = Tool.RunIn(folder.Path, ["audit", Path.GetFileName(design), "--quiet", "--as-of", "2026-12-01", .. Writes]);

        Assert.NotEqual(2, result.Code);
        foreach (var report in reports)
        {
            var committed = File.ReadAllText(Repository.PathOf($"examples/{Path.GetDirectoryName(design)}/{report}"));
            Assert.Equal(committed, File.ReadAllText(folder.File(report)));
        }
    }

    [Fact]
    public void Two_runs_in_another_place_language_and_time_zone_write_the_same_bytes()
    {
        using var here = new TemporaryFolder();
        using var there = new TemporaryFolder();
        here.CopyFrom(Repository.PathOf("examples/bakery"));
        there.CopyFrom(Repository.PathOf("examples/bakery"));
        string[] arguments = ["audit", "bakery.design.yaml", "--quiet", "--evidence", "--as-of", "2026-12-01", "--write", "a.json", "--write", "a.md"];

        Tool.RunIn(here.Path, arguments, ("LC_ALL", "C"), ("TZ", "Pacific/Auckland"));
        Tool.RunIn(there.Path, arguments, ("LC_ALL", "de_DE.UTF-8"), ("TZ", "America/St_Johns"), ("DOTNET_PROCESSOR_COUNT", "1"));

        Assert.Equal(File.ReadAllBytes(here.File("a.json")), File.ReadAllBytes(there.File("a.json")));
        Assert.Equal(File.ReadAllBytes(here.File("a.md")), File.ReadAllBytes(there.File("a.md")));
    }

    [Fact]
    public void Editing_one_limit_in_a_copy_of_the_rule_data_changes_the_findings()
    {
        using var copy = new TemporaryFolder();
        copy.CopyFrom(Repository.PathOf("rules"));
        var set = copy.File("sets/united-kingdom.yaml");
        File.WriteAllText(set, File.ReadAllText(set).Replace("voltage-drop-lighting:\n    value: 3 %", "voltage-drop-lighting:\n    value: 9 %", StringComparison.Ordinal));

        var before = Tool.Run("evidence", "examples/bakery/bakery.design.yaml", "voltage-drop-lighting:BK/16");
        var after = Tool.Run("evidence", "examples/bakery/bakery.design.yaml", "voltage-drop-lighting:BK/16", "--rules", copy.File("sets/united-kingdom.yaml"));

        Assert.StartsWith("voltage-drop-lighting:BK/16: nonconforming", before.Output, StringComparison.Ordinal);
        Assert.StartsWith("voltage-drop-lighting:BK/16: conforms", after.Output, StringComparison.Ordinal);
    }
}
