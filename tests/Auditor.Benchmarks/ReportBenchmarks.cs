using Auditor.Engine.Findings;
using Auditor.Reports.Files;
using Auditor.Reports.Json;
using Auditor.Reports.Model;
using Auditor.Reports.Schedules;
using Auditor.Reports.Templates;
using BenchmarkDotNet.Attributes;

namespace Auditor.Benchmarks;

/// <summary>Reports of an audit that is done.</summary>
public class ReportBenchmarks
{
    private AuditResult _result = null!;

    /// <summary>Which design.</summary>
    [Params(Inputs.Bakery, Inputs.Thousand)]
    public string Design { get; set; } = "";

    /// <summary>Audits once.</summary>
    [GlobalSetup]
    public void Audit() => _result = Inputs.Audit(Inputs.Build(Design, Inputs.Parse(Inputs.Text(Design))));

    /// <summary>The findings file.</summary>
    [Benchmark]
    public long Json()
    {
        using var stream = new MemoryStream();
        FindingsJson.Write(_result, Inputs.Register, new FindingsOptions(), stream);
        return stream.Length;
    }

    /// <summary>The report in Markdown, its model included.</summary>
    [Benchmark]
    public byte[] Markdown() => Written(ReportFormat.Markdown);

    /// <summary>The page, its model and pictures included.</summary>
    [Benchmark]
    public byte[] Html() => Written(ReportFormat.Html);

    private byte[] Written(ReportFormat format) => Inputs.Checked(problems =>
    {
        var template = TemplateFile.Shipped(format);
        var model = ReportModel.Build(_result, Inputs.Register, Schedule.For(template, _result.Rules, problems)!);
        return TemplateReport.Render(model, format, template, problems)!;
    });
}
