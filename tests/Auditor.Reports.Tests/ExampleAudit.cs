using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Reports.Tests;

/// <summary>Audits of the shipped examples by the shipped rules.</summary>
internal static class ExampleAudit
{
    private static readonly DateOnly Day = new(2026, 12, 1);

    private static readonly Lazy<RuleSet> Shipped = new(() => Faultless(problems =>
        RuleSetLoader.Load(new RuleHome(Repository.PathOf("rules"), "rules"), "united-kingdom", Repository.Root, null, problems)!));

    /// <summary>The shipped rules.</summary>
    public static RuleSet Rules => Shipped.Value;

    /// <summary>The examples, by their path below <c>examples</c>.</summary>
    public static IEnumerable<string> All =>
        Directory.EnumerateFiles(Repository.PathOf("examples"), "*.design.yaml", SearchOption.AllDirectories)
            .Select(file => Path.GetRelativePath(Repository.PathOf("examples"), file).Replace('\\', '/')).Order(StringComparer.Ordinal);

    /// <summary>Audits an example.</summary>
    public static AuditResult Of(string example) => At(Repository.PathOf("examples/" + example), "examples/" + example, Rules);

    /// <summary>Audits a design file anywhere.</summary>
    /// <param name="path">Where it lies.</param>
    /// <param name="shown">How its path is shown.</param>
    /// <param name="rules">The rules.</param>
    public static AuditResult At(string path, string shown, RuleSet rules) => Faultless(problems =>
    {
        var file = DesignFile.Read(path, shown, problems)!;
        rules.Schema.Validation.Validate(file.Root, problems);
        return Audit.Run(DesignBuilder.Build(file, new Evaluator(rules), problems)!, Day, problems);
    });

    private static T Faultless<T>(Func<Problems, T> make)
    {
        var problems = new Problems();
        var made = make(problems);
        return problems.HasErrors ? throw new InvalidOperationException(ProblemText.Render(problems.All)) : made;
    }
}
