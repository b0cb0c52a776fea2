using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.Registers;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Files;
using Auditor.Reports.Model;
using Auditor.Reports.Schedules;
using Auditor.Reports.Templates;
using Auditor.Reports.Json;
using Auditor.Testing;

namespace Auditor.Reports.Tests;

/// <summary>The rules for sheds, the designs that they are applied to, and their audits.</summary>
internal static class Sheds
{
    /// <summary>The day on which the tests judge departures.</summary>
    public static readonly DateOnly Day = new(2026, 9, 1);

    public static RuleSet Rules { get; } = LoadRules();

    public static Register Register { get; } = new(
        [
            new RegisterRow("shed-capacity", "shed", "Conductors carry their load.", "quantitative"),
            new RegisterRow("shed-device", "shed", "Devices are of allowed kinds.", "categorical"),
            new RegisterRow("shed-terminal", "shed", "There is a main earthing terminal.", "categorical"),
            new RegisterRow("shed-roof", "shed", "The roof keeps | rain off the board.", "quantitative"),
            new RegisterRow("shed-neat", "shed", "The work is neat.", "judgement"),
            new RegisterRow("tools-sharp", "tools", "Tools are sharp.", "judgement"),
        ]);

    /// <summary>Full path of a file of the test data.</summary>
    public static string Data(string path) => Repository.PathOf("tests/Auditor.Reports.Tests/data/" + path);

    /// <summary>Audits a design.</summary>
    /// <param name="design">Its name.</param>
    /// <param name="folder">How the folder of the design is shown, with a slash at its end.</param>
    public static AuditResult Audit(string design, string folder = "") => Faultless(problems =>
    {
        var path = $"designs/{design}.design.yaml";
        var file = DesignFile.Read(Data(path), folder + Path.GetFileName(path), problems)!;
        Rules.Schema.Validation.Validate(file.Root, problems);
        var built = problems.HasErrors ? null : DesignBuilder.Build(file, new Evaluator(Rules), problems);
        return built is null ? null! : Engine.Evaluation.Audit.Run(built, Day, problems);
    });

    /// <summary>The report model of a design, with the schedule of the test data.</summary>
    public static ReportModel Model(string design) => ReportModel.Build(Audit(design), Register, Schedule("schedules/shed/any.scriban-md"));

    /// <summary>The schedule that belongs to a template of the test data.</summary>
    public static Schedule Schedule(string template) => Faultless(problems => Schedules.Schedule.For(Template(template), Rules, problems)!);

    /// <summary>A template of the test data.</summary>
    public static TemplateFile Template(string path) => new(Data(path), path);

    /// <summary>A report from a template that has no fault.</summary>
    public static string Render(string design, ReportFormat format, TemplateFile template) =>
        System.Text.Encoding.UTF8.GetString(Faultless(problems => TemplateReport.Render(Model(design), format, template, problems)!));

    /// <summary>The findings file of an audit.</summary>
    public static byte[] Json(AuditResult result, FindingsOptions options)
    {
        using var stream = new MemoryStream();
        FindingsJson.Write(result, Register, options, stream);
        return stream.ToArray();
    }

    private static RuleSet LoadRules() => Faultless(problems =>
        RuleSetLoader.Load(new RuleHome(Repository.PathOf("rules"), "rules"), "rules/sets/shed.yaml", Data(""), null, problems)!);

    private static T Faultless<T>(Func<Problems, T> make)
    {
        var problems = new Problems();
        var made = make(problems);
        return problems.All.Count == 0 ? made : throw new InvalidOperationException(ProblemText.Render(problems.All));
    }
}
