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

namespace Auditor.Reports.Tests;

/// <summary>The rules for sheds, the designs that they are applied to, and their audits.</summary>
internal static class Sheds
{
    /// <summary>The day on which the tests judge departures.</summary>
    public static readonly DateOnly Day = new(2026, 9, 1);

    private static readonly RuleHome Home = new(Data("rules"), "rules");

    public static RuleSet Rules { get; } = LoadRules();

    public static Register Register { get; } = Faultless(problems => Register.Load(Home, problems));

    /// <summary>Full path of a file of the test data.</summary>
    public static string Data(string path) => Path.Combine(AppContext.BaseDirectory, "data", path);

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
        Faultless(problems => System.Text.Encoding.UTF8.GetString(TemplateReport.Render(Model(design), format, template, problems)!));

    private static RuleSet LoadRules() => Faultless(problems => RuleSetLoader.Load(Home, "shed", Data("designs"), null, problems)!);

    private static T Faultless<T>(Func<Problems, T> make)
    {
        var problems = new Problems();
        var made = make(problems);
        return problems.All.Count == 0 ? made : throw new InvalidOperationException(ProblemText.Render(problems.All));
    }
}
