using Auditor.Testing;

namespace Auditor.Documents.Tests;

public class WholeFileTests
{
    public static TheoryData<string> BadFiles => [.. Plan.CasesIn("Bad")];

    public static TheoryData<string> GoodFiles => [.. Plan.CasesIn("Good")];

    [Theory]
    [MemberData(nameof(BadFiles))]
    public void A_bad_file_has_just_the_problems_that_its_golden_file_lists(string name)
    {
        var problems = Plan.Check("Bad", name);

        Assert.True(problems.HasErrors);
        Golden.Match(ProblemText.Render(problems.All), $"{Plan.Files}/Bad/{name}");
    }

    [Theory]
    [MemberData(nameof(GoodFiles))]
    public void A_good_file_has_no_problems(string name) => Assert.Equal("", ProblemText.Render(Plan.Check("Good", name).All));

    [Fact]
    public void No_golden_file_is_left_over() => Assert.Empty(Golden.OrphansBelow(Plan.Files));
}
