using Auditor.Documents;
using Auditor.Engine.Registers;
using Auditor.Reports.Csv;
using Auditor.Reports.Files;
using Auditor.Reports.Json;
using Auditor.Reports.JUnit;
using Auditor.Reports.Model;
using Auditor.Reports.Sarif;
using Auditor.Reports.Schedules;
using Auditor.Reports.Templates;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>A small design, audited and written in every format.</summary>
internal sealed class AuditReports : FuzzKind
{
    private readonly Register _register = Register.Load(Corpus.Home, new Problems());

    public override IReadOnlyList<byte[]> Seeds { get; } = [.. Corpus.Files("examples/one-circuit", "*.design.yaml")];

    public override Judgement Judge(byte[] input)
    {
        var problems = new Problems();
        if (Audits.Audited(Folder.Write("fuzzed.design.yaml", input), problems) is not { } result)
        {
            return Judged(hasResult: false, problems);
        }

        var schedule = Schedule.For(null, result.Rules, problems)!;
        var model = ReportModel.Build(result, _register, schedule);
        using var json = new MemoryStream();
        FindingsJson.Write(result, _register, new FindingsOptions(AllEvidence: true), json);
        byte[]?[] reports =
        [
            json.ToArray(), SarifReport.Write(result, null), JUnitReport.Write(result), CsvSchedule.Write(result, schedule),
            .. ReportFormat.All.Where(format => format.TemplateName is not null)
                .Select(format => TemplateReport.Render(model, format, TemplateFile.Shipped(format), problems)),
        ];
        return Judged(reports.All(report => report is { Length: > 0 }), problems);
    }
}
