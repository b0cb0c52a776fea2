using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Engine.Tests;

/// <summary>Whole rule sets that are wrong, each with the list of all its problems.</summary>
public class BadRuleTests
{
    private const string Folder = $"{Small.Files}/BadRules";

    public static TheoryData<string> Sets =>
        [.. Directory.EnumerateDirectories(Repository.PathOf(Folder)).Select(folder => Path.GetFileName(folder)).Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Sets))]
    public void A_bad_set_has_just_the_problems_that_its_golden_file_lists(string name)
    {
        var problems = new Problems();
        var set = RuleSetLoader.Load(Small.Home, $"{name}/set.yaml", Repository.PathOf(Folder), null, problems);

        Assert.Null(set);
        Golden.Match(ProblemText.Render(problems.All), $"{Folder}/{name}");
    }
}
