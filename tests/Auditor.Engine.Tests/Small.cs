using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Engine.Tests;

/// <summary>The small rule set of the tests, and short ways to audit a design with it.</summary>
internal static class Small
{
    public const string Files = "tests/Auditor.Engine.Tests/Files";

    private static readonly Lazy<RuleSet> Loaded = new(() => LoadSound("small/small.yaml"));

    /// <summary>The shipped schemas.</summary>
    public static RuleHome Home { get; } = new(Repository.PathOf("rules"), "rules");

    public static RuleSet Rules => Loaded.Value;

    public static DateOnly Today { get; } = new(2026, 9, 14);

    /// <summary>A set of the test files, which must be without problems.</summary>
    public static RuleSet LoadSound(string path)
    {
        var set = Load(path, out var problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return set!;
    }

    public static RuleSet? Load(string path, out Problems problems)
    {
        problems = new Problems();
        return RuleSetLoader.Load(Home, path, Repository.PathOf($"{Files}/Rules"), null, problems);
    }

    /// <summary>A design of the test files, which must be without problems.</summary>
    public static Design Design(string name, RuleSet? rules = null) => Build(DesignText(name), rules);

    public static string DesignText(string name) => File.ReadAllText(Repository.PathOf($"{Files}/Designs/{name}.yaml"));

    /// <summary>Builds a design from its text, which must be without problems.</summary>
    public static Design Build(string text, RuleSet? rules = null)
    {
        var design = TryBuild(text, rules ?? Rules, out var problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return design!;
    }

    public static Design? TryBuild(string text, RuleSet rules, out Problems problems)
    {
        problems = new Problems();
        if (YamlReader.Read(new SourceText("design.yaml", text), problems) is not { } root)
        {
            return null;
        }

        rules.Schema.Validation.Validate(root, problems);
        return DesignBuilder.Build(new DesignFile("design.yaml", (MappingNode)root, []), new Evaluator(rules), problems);
    }

    public static AuditResult Audit(string text, DateOnly? asOf = null, RuleSet? rules = null)
    {
        var problems = new Problems();
        var result = Evaluation.Audit.Run(Build(text, rules), asOf ?? Today, problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return result;
    }
}
