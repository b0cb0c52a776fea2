using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Tables;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Json;

/// <summary>Writes what a findings file says before its findings: what was audited, how, and what was looked at.</summary>
internal static class HeadJson
{
    /// <summary>Version of the findings format.</summary>
    private const int Format = 2;

    public static void Write(JsonOutput output, AuditResult result)
    {
        output.Whole("format", Format);
        FileHead.Source(output);
        Project(output, result.Design);
        Basis(output, result);
        output.Object("ruleSet", () => RuleSet(output, result.Rules));
        Counts(output, result);
        output.Records("subjects", result.Subjects, subject => Subject(output, subject));
    }

    private static void Project(JsonOutput output, Design design) => output.Object("project", () =>
    {
        var said = ProjectWords.Of(design);
        output.Text("title", said("title"));
        output.Text("reference", said("reference"));
        output.Text("revision", said("revision"));
    });

    private static void Basis(JsonOutput output, AuditResult result) => output.Object("basis", () =>
    {
        output.Text("stage", AuditBasis.StageOf(result.Design) ?? AuditBasis.UsualStage);
        output.Text("decision", AuditBasis.Word(result.Decision));
        output.Text("asOf", result.AsOf is { } day ? DayText.Of(day) : null);
    });

    private static void RuleSet(JsonOutput output, RuleSet rules)
    {
        output.Text("name", rules.Title.Id);
        output.Text("title", rules.Title.Text);
        output.TextOrNull("edition", rules.Title.Edition);
        output.TextOrNull("notice", rules.Title.Notice);
        output.Text("sha256", rules.Title.Sha256);
        output.Records("parameters", rules.Parameters, parameter =>
        {
            output.Text("name", parameter.Id);
            output.Value("value", parameter.Value, parameter.Slot.Unit);
            output.Text("unit", parameter.Slot.Unit?.Symbol);
            output.TextOrNull("clause", parameter.Clause);
            output.TextOrNull("source", parameter.Source);
            output.Text("trust", parameter.Trust?.Word());
            output.Text("file", parameter.Span.Source.Path);
        });
    }

    private static void Counts(JsonOutput output, AuditResult result) => output.Object("counts", () =>
    {
        output.Whole("conforms", result.Count(Verdict.Conforms));
        output.Whole("nonconforming", result.Count(Verdict.Nonconforming));
        output.Whole("unproven", result.Count(Verdict.Unproven));
        output.Whole("undetermined", result.Count(Verdict.Undetermined));
        output.Whole("departed", result.Count(Verdict.Departed));
        output.Whole("onAssumption", result.Findings.Count(finding => finding.Verdict == Verdict.Conforms && finding.OnAssumption));
    });

    private static void Subject(JsonOutput output, DesignSubject subject)
    {
        output.Text("key", subject.Key);
        output.Text("kind", subject.Shape.Name);
        output.Text("name", SubjectText.OwnName(subject));
        output.Text("parent", subject.Parent?.Key);
        output.Location(subject.Place);
    }
}
