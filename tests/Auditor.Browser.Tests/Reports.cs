using System.Collections.Concurrent;
using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Registers;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Files;
using Auditor.Reports.Model;
using Auditor.Reports.Schedules;
using Auditor.Reports.Templates;
using Auditor.Reports.Tests;
using Auditor.Testing;

namespace Auditor.Browser.Tests;

/// <summary>The pages of designs, each written once.</summary>
internal static class Reports
{
    private static readonly string Folder = Directory.CreateTempSubdirectory("pages-").FullName;

    private static readonly ConcurrentDictionary<string, Lazy<WrittenPage>> Written = new();

    private static readonly Lazy<Register> Requirements = new(() => Register.Load(new RuleHome(Repository.PathOf("rules"), "rules"), new Problems()));

    /// <summary>The page of an example, by its path below <c>examples</c>.</summary>
    public static WrittenPage OfExample(string example) =>
        Written.GetOrAdd(example, name => new Lazy<WrittenPage>(() => Write(name, ExampleAudit.Of(name)))).Value;

    /// <summary>The page of a design file anywhere.</summary>
    public static WrittenPage OfDesign(string path) =>
        Written.GetOrAdd(path, _ => new Lazy<WrittenPage>(() => Write(Path.GetFileName(path), ExampleAudit.At(path, Path.GetFileName(path), ExampleAudit.Rules)))).Value;

    /// <summary>Full path of a file to be written by a test.</summary>
    public static string NewFile(string name) => Path.Combine(Folder, name);

    private static WrittenPage Write(string name, AuditResult result)
    {
        var problems = new Problems();
        var template = TemplateFile.Shipped(ReportFormat.Html);
        var model = ReportModel.Build(result, Requirements.Value, Schedule.For(template, result.Rules, problems)!);
        var bytes = TemplateReport.Render(model, ReportFormat.Html, template, problems)
            ?? throw new InvalidOperationException(ProblemText.Render(problems.All));
        var path = NewFile(name.Replace('/', '-') + ".html");
        File.WriteAllBytes(path, bytes);
        return new WrittenPage(path, bytes.Length, model);
    }
}
