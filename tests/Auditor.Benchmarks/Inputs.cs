using Auditor.Browser.Tests;
using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.Registers;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Benchmarks;

/// <summary>What is measured: the shipped rules, the bakery among the examples, and a made-up design of a thousand circuits.</summary>
internal static class Inputs
{
    public const string Bakery = "bakery";
    public const string Thousand = "1,000 circuits";

    private const string BakeryPath = "examples/bakery/bakery.design.yaml";

    private static readonly DateOnly Day = new(2026, 12, 1);

    public static RuleHome Home { get; } = new(Repository.PathOf("rules"), "rules");

    public static RuleSet Rules { get; } = Load(Home);

    public static Register Register { get; } = Checked(problems => Register.Load(Home, problems));

    /// <summary>The shipped rules for the United Kingdom, from the files of a home.</summary>
    public static RuleSet Load(RuleHome home) => Checked(problems => RuleSetLoader.Load(home, "united-kingdom", Repository.Root, null, problems)!);

    public static SourceText Text(string name) => name == Bakery
        ? new SourceText(BakeryPath, File.ReadAllText(Repository.PathOf(BakeryPath)))
        : new SourceText("large.design.yaml", LargeDesign.Text(1000));

    /// <summary>Reads a text as YAML.</summary>
    public static MappingNode Parse(SourceText text) => Checked(problems => (MappingNode)YamlReader.Read(text, problems)!);

    /// <summary>A design of which nothing is computed as yet.</summary>
    public static Design Build(string name, MappingNode root) =>
        Checked(problems => DesignBuilder.Build(new DesignFile(name, root, []), new Evaluator(Rules), problems)!);

    public static AuditResult Audit(Design design) => Checked(problems => Engine.Evaluation.Audit.Run(design, Day, problems));

    /// <summary>How many decisions of a rule on a subject an audit takes.</summary>
    public static int Judgements(string name) => Build(name, Parse(Text(name))).Subjects.Sum(subject => Rules.RulesOf(subject.Shape).Count);

    /// <summary>What is made, if nothing was wrong: a benchmark of a failure would measure nothing.</summary>
    public static T Checked<T>(Func<Problems, T> make)
    {
        var problems = new Problems();
        var made = make(problems);
        return problems.HasErrors ? throw new InvalidOperationException(ProblemText.Render(problems.All)) : made;
    }
}
