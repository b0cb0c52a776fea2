using System.Text;
using Auditor.Documents;
using Auditor.Reports.Files;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Tests;

public class PlainTextTests
{
    private const string Ten = "123456789 ";

    [Fact]
    public void A_line_of_a_hundred_columns_stays_whole()
    {
        var line = string.Concat(Enumerable.Repeat(Ten, 9)) + "1234567890";

        Assert.Equal(100, line.Length);
        Assert.StartsWith(line + "\n", Write(line), StringComparison.Ordinal);
    }

    [Fact]
    public void A_longer_line_breaks_at_the_last_blank_within_bounds()
    {
        var line = string.Concat(Enumerable.Repeat(Ten, 9)) + "1234567890X";

        Assert.StartsWith(string.Concat(Enumerable.Repeat(Ten, 9)).TrimEnd() + "\n1234567890X\n", Write(line), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("- ", "  ")]
    [InlineData("    ", "    ")]
    [InlineData("why        ", "           ")]
    [InlineData("  put right  ", "             ")]
    public void A_broken_line_goes_on_under_its_text(string lead, string hang)
    {
        var lines = Write(lead + string.Concat(Enumerable.Repeat(Ten, 22))).Split('\n');

        Assert.StartsWith(lead + "123456789 ", lines[0], StringComparison.Ordinal);
        Assert.StartsWith(hang + "123456789 ", lines[1], StringComparison.Ordinal);
        Assert.StartsWith(hang + "123456789", lines[2], StringComparison.Ordinal);
        Assert.All(lines, line => Assert.True(line.Length <= 100, line));
    }

    [Fact]
    public void A_word_that_fits_nowhere_stands_alone()
    {
        var word = new string('x', 140);

        Assert.StartsWith($"- a\n  {word}\n  b\n", Write($"- a {word} b"), StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("garden")]
    [InlineData("hostile")]
    public void No_line_of_the_shipped_report_is_longer_than_a_hundred_columns(string design) =>
        Assert.All(
            Sheds.Render(design, ReportFormat.Text, TemplateFile.Shipped(ReportFormat.Text)).Split('\n'),
            line => Assert.True(line.Length <= 100, line));

    [Fact]
    public void Text_is_shown_as_it_is_but_for_breaks_and_what_turns_it_around() =>
        Assert.StartsWith("| <b> [x]  *y* \uFFFD z\n", Write("{{ report.project.title }}", "| <b> [x]  *y* \u202E\n \n z"), StringComparison.Ordinal);

    private static string Write(string template, string title = "")
    {
        using var folder = new TemporaryFolder();
        var model = Sheds.Model("garden");
        var file = new TemplateFile(folder.Write("t.scriban-txt", template + "\n{{ report.caution }}"), "t.scriban-txt");
        var problems = new Problems();
        var bytes = TemplateReport.Render(model with { Project = model.Project with { Title = title } }, ReportFormat.Text, file, problems);
        Assert.Empty(problems.All);
        return Encoding.UTF8.GetString(bytes!);
    }
}
