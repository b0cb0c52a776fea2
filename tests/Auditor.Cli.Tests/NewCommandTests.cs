using System.Text.Json;

namespace Auditor.Cli.Tests;

public class NewCommandTests
{
    [Theory]
    [InlineData("1")]
    [InlineData("3")]
    public void A_new_design_is_valid_and_meets_every_requirement_that_can_be_judged(string phases)
    {
        using var folder = new TemporaryFolder();

        var made = Tool.RunIn(folder.Path, ["new", "site", "--phases", phases]);
        var audited = Tool.RunIn(folder.Path, ["audit", "site.design.yaml", "--fail-on", "nonconforming", "--write", "site.json"]);

        Assert.Equal((0, "Wrote site.design.yaml. Next: auditor audit site.design.yaml\n", ""), (made.Code, made.Output, made.Error));
        Assert.Equal((0, ""), (audited.Code, audited.Error));
        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("site.json")));
        Assert.Equal("site", json.RootElement.GetProperty("project").GetProperty("title").GetString());
        Assert.True(json.RootElement.GetProperty("counts").GetProperty("conforms").GetInt32() > 50);
    }

    [Fact]
    public void A_design_that_is_there_already_stays_as_it_is()
    {
        using var folder = new TemporaryFolder();
        File.WriteAllText(folder.File("site.design.yaml"), "precious");

        var result = Tool.RunIn(folder.Path, ["new", "site"]);

        Assert.Equal(2, result.Code);
        Assert.StartsWith("error file-is-there: `site.design.yaml` is there already", result.Error, StringComparison.Ordinal);
        Assert.Equal("precious", File.ReadAllText(folder.File("site.design.yaml")));
    }

    [Fact]
    public void The_name_of_the_job_is_the_last_part_of_the_path_whatever_it_holds()
    {
        using var folder = new TemporaryFolder();
        Directory.CreateDirectory(folder.File("jobs"));

        Tool.RunIn(folder.Path, ["new", "jobs/no. 3: \"Yard\" # B.design.yaml"]);
        Tool.RunIn(folder.Path, ["audit", "jobs/no. 3: \"Yard\" # B.design.yaml", "--quiet", "--write", "a.json"]);

        using var json = JsonDocument.Parse(File.ReadAllText(folder.File("a.json")));
        Assert.Equal("no. 3: \"Yard\" # B", json.RootElement.GetProperty("project").GetProperty("title").GetString());
    }

    [Theory]
    [InlineData("site", "2")]
    [InlineData("none/site", "1")]
    public void Two_phases_or_a_folder_that_is_not_there_are_told_and_leave_nothing(string name, string phases)
    {
        using var folder = new TemporaryFolder();

        var result = Tool.RunIn(folder.Path, ["new", name, "--phases", phases]);

        Assert.Equal(2, result.Code);
        Assert.NotEmpty(result.Error);
        Assert.Empty(Directory.EnumerateFileSystemEntries(folder.Path));
    }
}
