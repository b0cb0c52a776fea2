using Auditor.Documents;
using Auditor.Reports.Schedules;
using Auditor.Reports.Templates;

namespace Auditor.Fuzz.Tests.Kinds;

/// <summary>Lists of the columns of the schedule of circuits.</summary>
internal sealed class Schedules : FuzzKind
{
    public override IReadOnlyList<byte[]> Seeds { get; } = [.. Corpus.Files("templates", "schedule.yaml"), .. Corpus.Files("tests/Auditor.Reports.Tests/data/schedules", "*.yaml")];

    public override Judgement Judge(byte[] input)
    {
        Folder.Write(Schedule.FileName, input);
        var problems = new Problems();
        var template = new TemplateFile(Folder.File("report.scriban-md"), "report.scriban-md");
        return Judged(Schedule.For(template, Corpus.Rules, problems) is not null, problems);
    }
}
