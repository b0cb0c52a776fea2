using Auditor.Testing;

namespace Auditor.Cli.Tests;

/// <summary>Each design in <c>broken/</c> is broken in a way of its own; all that is wrong with it is told at once.</summary>
public class BrokenDesignTests
{
    private const string Folder = "tests/Auditor.Cli.Tests/broken";

    public static TheoryData<string> Designs =>
        [.. Directory.EnumerateFiles(Repository.PathOf(Folder), "*.design.yaml").Select(file => Path.GetFileName(file)).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Designs))]
    public void A_broken_design_is_told_in_full_and_gets_no_report(string design)
    {
        using var folder = new TemporaryFolder();
        var report = folder.File("out.json");

        var result = Tool.Run("audit", $"{Folder}/{design}", "--write", report);

        Assert.Equal(2, result.Code);
        Assert.Empty(result.Output);
        Assert.False(File.Exists(report));
        Golden.Match(result.Error, $"{Folder}/{design[..^".design.yaml".Length]}");
    }

    [Fact]
    public void There_are_at_least_ten_ways() => Assert.True(Designs.Count >= 10);

    [Fact]
    public void One_broken_design_among_sound_ones_stops_the_run()
    {
        using var folder = new TemporaryFolder();
        File.Copy(Repository.PathOf("examples/one-circuit/one-circuit.design.yaml"), folder.File("sound.design.yaml"));
        File.Copy(Repository.PathOf($"{Folder}/04-no-unit.design.yaml"), folder.File("unsound.design.yaml"));

        var result = Tool.RunIn(folder.Path, ["audit", ".", "--write", "{name}.json"]);

        Assert.Equal(2, result.Code);
        Assert.Contains("unsound.design.yaml:2:", result.Error, StringComparison.Ordinal);
        Assert.False(File.Exists(folder.File("sound.json")));
    }
}
