using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleTests;

namespace Auditor.Rules.Tests;

/// <summary>The verdict of a rule on a subject made up for a test.</summary>
internal static class RuleVerdict
{
    /// <summary>The verdict in a word; <c>none</c> where the rule does not apply.</summary>
    public static string Of(string id, string given)
    {
        var problems = new Problems();
        var node = (MappingNode)YamlReader.Read(new SourceText("given", given), problems)!;
        var set = Shipped.Set(Shipped.UnitedKingdom);
        var judgement = new CaseRunner(set, problems).Judge(set.Rules.Single(rule => rule.Id == id), node);
        Assert.Equal("", ProblemText.Render(problems.All));
        return judgement.Verdict?.Word() ?? "none";
    }
}
