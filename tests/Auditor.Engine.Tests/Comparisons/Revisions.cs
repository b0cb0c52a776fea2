using Auditor.Documents;
using Auditor.Engine.Comparisons;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Testing;

namespace Auditor.Engine.Tests.Comparisons;

/// <summary>Audits states of a design with the plain rule set beside these tests, and compares them.</summary>
internal static class Revisions
{
    private const string RulesFolder = "tests/Auditor.Engine.Tests/Comparisons/rules";

    private static readonly Lazy<RuleSet> Plain = new(() => Load(Repository.PathOf(RulesFolder)));

    /// <summary>Compares two states of a design, audited with the plain set.</summary>
    public static RevisionComparison Compare(string before, string after) => RevisionComparison.Of(Of(before, Plain.Value), Of(after, Plain.Value));

    /// <summary>Compares two states of a design, the later one audited with the plain set as edited.</summary>
    public static RevisionComparison Compare(string before, string after, params (string File, string Old, string New)[] edits) =>
        RevisionComparison.Of(Of(before, Plain.Value), Of(after, Edited(edits)));

    /// <summary>The revision of a design, audited with a rule set.</summary>
    public static Revision Of(string yaml, RuleSet? rules = null) => Revision.Of("site.design.yaml", Audited(yaml, rules ?? Plain.Value));

    /// <summary>The plain set as edited.</summary>
    public static RuleSet Rules(params (string File, string Old, string New)[] edits) => Edited(edits);

    /// <summary>What a findings file tells of a revision: neither the audit nor what the design states.</summary>
    public static Revision FromFile(Revision revision) => new()
    {
        Name = "findings.json",
        Mark = revision.Mark,
        Inputs = revision.Inputs,
        Rules = revision.Rules,
        Subjects = [.. revision.Subjects.Select(subject => new RevisionSubject(subject.Key, subject.Kind, subject.Name, subject.Parent))],
        Findings = revision.Findings,
        Departures = revision.Departures,
    };

    /// <summary>A text with one part of it replaced; fails where the part is not there.</summary>
    public static string With(this string text, string old, string replacement)
    {
        Assert.Contains(old, text, StringComparison.Ordinal);
        return text.Replace(old, replacement, StringComparison.Ordinal);
    }

    private static AuditResult Audited(string yaml, RuleSet rules)
    {
        var problems = new Problems();
        var path = Path.Combine(Directory.CreateTempSubdirectory("auditor-").FullName, "site.design.yaml");
        File.WriteAllText(path, yaml);
        var file = DesignFile.Read(path, "site.design.yaml", problems)!;
        Directory.Delete(Path.GetDirectoryName(path)!, recursive: true);
        rules.Schema.Validation.Validate(file.Root, problems);
        var design = DesignBuilder.Build(file, new Evaluator(rules), problems);
        Assert.False(problems.HasErrors, ProblemText.Render(problems.All));
        return Audit.Run(design!, new DateOnly(2026, 12, 1), problems);
    }

    private static RuleSet Edited((string File, string Old, string New)[] edits)
    {
        var copy = Directory.CreateTempSubdirectory("auditor-").FullName;
        foreach (var source in Directory.EnumerateFiles(Repository.PathOf(RulesFolder), "*.yaml", SearchOption.AllDirectories))
        {
            var name = Path.GetRelativePath(Repository.PathOf(RulesFolder), source);
            Directory.CreateDirectory(Path.GetDirectoryName(Path.Combine(copy, name))!);
            var text = edits.Where(edit => edit.File == name).Aggregate(File.ReadAllText(source), (was, edit) => was.With(edit.Old, edit.New));
            File.WriteAllText(Path.Combine(copy, name), text);
        }

        var rules = Load(copy);
        Directory.Delete(copy, recursive: true);
        return rules;
    }

    private static RuleSet Load(string folder)
    {
        var problems = new Problems();
        var rules = RuleSetLoader.Load(new RuleHome(Repository.PathOf("rules"), "rules"), "./plain.yaml", folder, null, problems);
        Assert.False(problems.HasErrors, ProblemText.Render(problems.All));
        return rules!;
    }
}
