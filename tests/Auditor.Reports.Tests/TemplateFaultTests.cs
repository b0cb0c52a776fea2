using Auditor.Documents;
using Auditor.Reports.Files;
using Auditor.Reports.Templates;
using Auditor.Testing;

namespace Auditor.Reports.Tests;

public class TemplateFaultTests
{
    private static readonly TemplateLimits Narrow = TemplateLimits.Default with { LoopSteps = 1_000, Evaluations = 20_000, Characters = 20_000 };

    public static TheoryData<string> Faults =>
        [.. Directory.EnumerateFiles(Sheds.Data("faults"), "*.scriban-md").Select(path => Path.GetFileNameWithoutExtension(path))
            .Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(Faults))]
    public void A_fault_in_a_template_is_told_with_its_place(string name)
    {
        var problems = new Problems();

        var template = Sheds.Template($"faults/{name}.scriban-md");
        var report = TemplateReport.Render(Sheds.Model("garden"), ReportFormat.Markdown, template, problems, Narrow);

        Assert.Null(report);
        Golden.Match(ProblemText.Render(problems.All), $"tests/Auditor.Reports.Tests/data/faults/{name}");
    }

    public static TheoryData<string> PageFaults =>
        [.. Directory.EnumerateFiles(Sheds.Data("page-faults"), "*.scriban-html").Select(path => Path.GetFileNameWithoutExtension(path))
            .Order(StringComparer.Ordinal)];

    [Theory]
    [MemberData(nameof(PageFaults))]
    public void A_fault_in_the_template_of_a_page_is_told_with_its_place(string name)
    {
        var problems = new Problems();

        var report = TemplateReport.Render(Sheds.Model("garden"), ReportFormat.Html, Sheds.Template($"page-faults/{name}.scriban-html"), problems, Narrow);

        Assert.Null(report);
        Golden.Match(ProblemText.Render(problems.All), $"tests/Auditor.Reports.Tests/data/page-faults/{name}");
    }

    [Fact]
    public void A_template_that_takes_too_long_is_stopped()
    {
        using var folder = new TemporaryFolder();
        var problems = new Problems();
        var template = new TemplateFile(folder.Write("t.scriban-html", "{{ report.caution; for a in 1..1000000; a * a; end }}"), "t.scriban-html");

        var report = TemplateReport.Render(Sheds.Model("garden"), ReportFormat.Html, template, problems, TemplateLimits.Default with { Time = TimeSpan.Zero });

        Assert.Null(report);
        Assert.Equal("template-limit", Assert.Single(problems.All).Code);
    }

    [Theory]
    [InlineData("{{ while true }}{{ end }}")]
    [InlineData("{{ for a in 1..1000 }}{{ for b in 1..1000 }}{{ for c in 1..1000 }}{{ end }}{{ end }}{{ end }}")]
    [InlineData("{{ x = 'abcdefgh'; while true; x = x + x; end }}")]
    [InlineData("{{ (1..999999) | array.join (1..999999) }}")]
    public void A_hostile_template_comes_to_an_end_within_the_usual_limits(string hostile)
    {
        using var folder = new TemporaryFolder();
        var problems = new Problems();

        var template = new TemplateFile(folder.Write("t.scriban-txt", "{{ report.caution }}" + hostile), "t.scriban-txt");
        var report = TemplateReport.Render(Sheds.Model("garden"), ReportFormat.Text, template, problems);

        Assert.Null(report);
        Assert.Contains(problems.All, problem => problem.Code is "template-limit" or "template-fault");
    }

    [Fact]
    public void A_symbolic_link_in_the_folder_leads_nowhere()
    {
        using var folder = new TemporaryFolder();
        folder.Link("inside.scriban-md", Sheds.Data("rules/sets/shed.yaml"));
        folder.Link("away", Sheds.Data("rules"));
        var top = folder.Write("t.scriban-md", "{{ report.caution }}{{ include 'inside.scriban-md' }}");
        var second = folder.Write("u.scriban-md", "{{ report.caution }}{{ include 'away/sets/shed.yaml' }}");
        var problems = new Problems();

        Assert.Null(TemplateReport.Render(Sheds.Model("garden"), ReportFormat.Markdown, new TemplateFile(top, "t.scriban-md"), problems));
        Assert.Null(TemplateReport.Render(Sheds.Model("garden"), ReportFormat.Markdown, new TemplateFile(second, "u.scriban-md"), problems));

        Assert.Equal(["template-outside-folder", "template-outside-folder"], problems.All.Select(problem => problem.Code));
    }

    [Fact]
    public void A_template_that_is_not_there_is_a_problem()
    {
        var problems = new Problems();

        Assert.Null(TemplateReport.Render(Sheds.Model("garden"), ReportFormat.Markdown, Sheds.Template("faults/none.scriban-md"), problems));

        Assert.Equal("faults/none.scriban-md", Assert.Single(problems.All).Span!.Value.Source.Path);
    }

    [Fact]
    public void Findings_for_programs_are_not_written_from_a_template() =>
        Assert.Throws<ArgumentException>(() => TemplateReport.Render(Sheds.Model("garden"), ReportFormat.Json, Sheds.Template("x"), new Problems()));
}
