using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Registers;
using Auditor.Reports.Files;
using Auditor.Reports.Model;
using Auditor.Reports.Schedules;
using Auditor.Reports.Templates;
using Auditor.Testing;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>Report templates of one format: a report of a small audit is written by each.</summary>
internal sealed class Templates : FuzzKind
{
    private static readonly DateOnly Day = new(2026, 12, 1);

    /// <summary>Narrower than those of reports, lest a run consist of endless loops.</summary>
    private static readonly TemplateLimits Narrow = TemplateLimits.Default with { LoopSteps = 50_000, Evaluations = 200_000, Characters = 4_000_000 };

    private readonly ReportModel _model;
    private readonly ReportFormat _format;

    public Templates(string ending)
    {
        _format = ending == ".scriban-md" ? ReportFormat.Markdown : ReportFormat.Html;
        Folder.With("templates");
        var problems = new Problems();
        var design = Corpus.Design("tests/Auditor.Reports.Tests/data/designs/garden.design.yaml", Corpus.Load("rules/sets/shed.yaml", Repository.PathOf("tests/Auditor.Reports.Tests/data")));
        var schedule = Schedule.For(null, design.Evaluator.Rules, problems)!;
        _model = ReportModel.Build(Audit.Run(design, Day, problems), Register.Load(Corpus.Home, problems), schedule);
        Seeds =
        [
            .. Corpus.Files("templates", "report" + ending).Concat(Corpus.Files("templates", "*" + ending)),
            .. Corpus.Files("tests/Auditor.Reports.Tests/data", "*" + ending),
        ];
    }

    /// <summary>Many of them are templates with a fault, which the tests of templates are made of.</summary>
    public override IReadOnlyList<byte[]> Seeds { get; }

    public override Judgement Judge(byte[] input)
    {
        var problems = new Problems();
        var template = new TemplateFile(Folder.Write("fuzzed.scriban", input), "fuzzed.scriban");
        return Judged(TemplateReport.Render(_model, _format, template, problems, Narrow) is not null, problems);
    }
}
