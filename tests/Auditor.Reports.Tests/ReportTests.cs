using System.Text;
using Auditor.Reports.Files;
using Auditor.Reports.Json;
using Auditor.Reports.Templates;
using Auditor.Testing;

namespace Auditor.Reports.Tests;

public class ReportTests
{
    private const string Designs = "tests/Auditor.Reports.Tests/data/designs";

    public static TheoryData<string> Names => ["garden", "hostile"];

    [Theory]
    [MemberData(nameof(Names))]
    public void The_Markdown_report_is_as_approved(string design) =>
        Golden.Match(Sheds.Render(design, ReportFormat.Markdown, TemplateFile.Shipped(ReportFormat.Markdown)), $"{Designs}/{design}", "md");

    [Theory]
    [MemberData(nameof(Names))]
    public void The_text_report_is_as_approved(string design) =>
        Golden.Match(Sheds.Render(design, ReportFormat.Text, TemplateFile.Shipped(ReportFormat.Text)), $"{Designs}/{design}");

    [Fact]
    public void The_findings_file_is_as_approved() =>
        Golden.Match(
            Encoding.UTF8.GetString(Sheds.Json(Sheds.Audit("garden"), new FindingsOptions())), $"{Designs}/garden", "json");

    [Fact]
    public void No_golden_file_is_left_over() => Assert.Empty(Golden.OrphansBelow("tests/Auditor.Reports.Tests/data"));
}
