using Auditor.Documents;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Limits.Tests;

/// <summary>The shipped rule data, read once.</summary>
internal static class Shipped
{
    public static RuleHome Home { get; } = new(Repository.PathOf("rules"), "rules");

    public static RuleSet UnitedKingdom { get; } = Load("united-kingdom");

    /// <summary>A house set of the test data, built on the shipped rules.</summary>
    public static RuleSet House(string name) => Load(Path.Combine(AppContext.BaseDirectory, "data", name + ".yaml"));

    private static RuleSet Load(string name)
    {
        var problems = new Problems();
        var set = RuleSetLoader.Load(Home, name, Repository.Root, null, problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return set!;
    }
}
