using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Reports.Tests.Pictures;

/// <summary>What a picture shows is data of the rule set, which a house set can replace.</summary>
public class PicturePlanTests
{
    private const string Profile =
        """
        picture: voltage-drop
        title: Drop as we like it
        about: The drop on the way.
        place: 7
        profile:
          installation: { along: L_total, value: vd_total }
          board: { along: L_total, value: vd_db }
          circuit: { along: L_total, value: vd_total }

        """;

    [Fact]
    public void A_house_set_replaces_a_picture_by_its_name()
    {
        var rules = Load(Profile, out var problems);

        Assert.Empty(problems.All);
        Assert.Equal("Drop as we like it", rules!.Pictures[0].Title);
        Assert.Single(rules.Pictures, plan => plan.Id == "voltage-drop");
    }

    [Theory]
    [InlineData("vd_total }\n  board", "vd_totl }\n  board", "house/pictures/own.yaml:6:42", "vd_totl")]
    [InlineData("{ along: L_total, value: vd_db }", "{ along: Zdb, value: vd_db }", "house/pictures/own.yaml:7:19", "m")]
    [InlineData("place: 7", "plaice: 7", "house/pictures/own.yaml:4:1", "plaice")]
    [InlineData("  circuit: { along: L_total, value: vd_total }\n", "", "house/pictures/own.yaml:5", "circuit")]
    public void A_symbol_that_the_set_does_not_know_is_a_problem_with_its_place(string right, string wrong, string place, string word)
    {
        Assert.Contains(right, Profile);
        var rules = Load(Profile.Replace(right, wrong, StringComparison.Ordinal), out var problems);
        var told = ProblemText.Render(problems.All);

        Assert.Null(rules);
        Assert.Contains(place, told);
        Assert.Contains(word, told);
    }

    [Fact]
    public void A_set_has_a_picture_only_once()
    {
        Load(Profile, out var problems, again: Profile);

        Assert.Contains("duplicate-picture", ProblemText.Render(problems.All));
    }

    private static RuleSet? Load(string picture, out Problems problems, string? again = null)
    {
        using var folder = new TemporaryFolder();
        folder.Write("house/house.yaml", "set: house\ntitle: House\nextends: united-kingdom\nuses: { pictures: [pictures] }\n");
        folder.Write("house/pictures/own.yaml", picture);
        if (again is not null)
        {
            folder.Write("house/pictures/second.yaml", again);
        }

        problems = new Problems();
        return RuleSetLoader.Load(new RuleHome(Repository.PathOf("rules"), "rules"), "house/house.yaml", folder.Path, null, problems);
    }
}
