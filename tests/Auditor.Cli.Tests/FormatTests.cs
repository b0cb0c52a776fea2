using System.Text.Json;
using System.Xml.Linq;
using Auditor.Testing;

namespace Auditor.Cli.Tests;

public class FormatTests
{
    [Fact]
    public void Formats_for_other_programs_are_the_same_bytes_anywhere_and_go_by_their_endings()
    {
        using var here = new TemporaryFolder();
        using var there = new TemporaryFolder();
        here.CopyFrom(Repository.PathOf("examples/workshop"));
        there.CopyFrom(Repository.PathOf("examples/workshop"));
        string[] files = ["a.sarif", "a.xml", "a.csv"];
        string[] arguments = ["audit", "workshop.design.yaml", "--quiet", "--as-of", "2026-12-01", .. files.SelectMany(file => new[] { "--write", file })];

        var result = Tool.RunIn(here.Path, arguments, ("LC_ALL", "C"), ("TZ", "Pacific/Auckland"));
        Tool.RunIn(there.Path, arguments, ("LC_ALL", "de_DE.UTF-8"), ("TZ", "America/St_Johns"), ("DOTNET_PROCESSOR_COUNT", "1"));

        Assert.Equal((1, ""), (result.Code, result.Error));
        Assert.All(files, file => Assert.Equal(File.ReadAllBytes(here.File(file)), File.ReadAllBytes(there.File(file))));
        using var sarif = JsonDocument.Parse(File.ReadAllText(here.File("a.sarif")));
        Assert.Equal("2.1.0", sarif.RootElement.GetProperty("version").GetString());
        Assert.Equal("testsuites", XDocument.Load(here.File("a.xml")).Root!.Name.LocalName);
        Assert.StartsWith("Circuit,Name,", File.ReadAllText(here.File("a.csv")), StringComparison.Ordinal);
    }
}
