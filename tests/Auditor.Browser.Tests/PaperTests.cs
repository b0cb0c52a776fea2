using Auditor.Reports.Model;
using Microsoft.Playwright;
using UglyToad.PdfPig;

namespace Auditor.Browser.Tests;

/// <summary>The page as it is printed, and without scripts.</summary>
public class PaperTests(Chromium chromium)
{
    private static readonly WrittenPage Circuit = Reports.OfExample("one-circuit/one-circuit.design.yaml");

    private static readonly ReportFinding[] Findings = [.. Circuit.Model.Rules.SelectMany(rule => rule.Findings)];

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public async Task The_print_out_has_every_finding_though_all_are_folded_and_some_filtered_away(bool isEarly)
    {
        const string Filtered = "?verdict=undetermined";
        await using var open = isEarly ? await chromium.OpenBusy(Circuit.Path, Filtered) : await chromium.Open(Circuit.Path, fragment: Filtered);

        var pages = await Print(open, $"one-circuit-{isEarly}.pdf");

        var text = string.Concat(pages);
        Assert.All(Circuit.Model.Rules, rule => Assert.Contains(Squeezed(rule.Title), text, StringComparison.Ordinal));
        Assert.All(Findings, finding => Assert.Contains(Squeezed($"{finding.SubjectLabel}{finding.Verdict}{finding.Value}"), text, StringComparison.Ordinal));
        Assert.All(Findings.Where(finding => finding.VerdictWord != "conforms"), finding => Assert.Contains(SentenceOf(finding), text, StringComparison.Ordinal));
        Assert.DoesNotContain(SentenceOf(Findings.First(finding => finding.VerdictWord == "conforms" && finding.Value != "")), text, StringComparison.Ordinal);
        Assert.Contains(Squeezed(Circuit.Model.Caution), text, StringComparison.Ordinal);
        Assert.Contains("Onpaper,whatconforms", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_print_out_has_every_derivation_and_all_workings_where_that_is_asked_for()
    {
        await using var open = await chromium.Open(Circuit.Path);
        await open.Page.Locator(".unfold input").CheckAsync();

        var text = string.Concat(await Print(open, "one-circuit-unfolded.pdf"));

        Assert.All(Findings, finding => Assert.Contains(SentenceOf(finding), text, StringComparison.Ordinal));
        Assert.All(Circuit.Model.Workings.Subjects, subject => Assert.Contains(Squeezed(subject.Quantities[^1].Name), text, StringComparison.Ordinal));
        Assert.DoesNotContain("Onpaper,whatconforms", text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Every_printed_page_names_the_job_its_revision_and_its_number()
    {
        await using var open = await chromium.Open(Circuit.Path);

        var pages = await Print(open, "one-circuit-heads.pdf");

        var (project, total) = (Circuit.Model.Project, pages.Count);
        Assert.Equal("GO-1", project.Reference);
        Assert.All(pages.Index(), page =>
        {
            Assert.Contains(Squeezed($"{project.Reference}, revision {project.Revision}"), page.Item, StringComparison.Ordinal);
            Assert.Contains($"page{page.Index + 1}of{total}", page.Item, StringComparison.Ordinal);
        });
    }

    [Fact]
    public async Task Without_scripts_every_finding_can_be_read_and_no_filter_is_offered()
    {
        await using var open = await chromium.Open(Circuit.Path, new BrowserNewContextOptions { JavaScriptEnabled = false });

        var rule = open.Page.Locator(".rule[data-clause='automatic disconnection']").First;
        await rule.Locator("summary").First.ClickAsync();
        await rule.Locator(".f > summary").First.ClickAsync();

        Assert.True(await rule.Locator(".f .from").First.IsVisibleAsync());
        Assert.False(await open.Page.Locator(".filter").IsVisibleAsync());
        Assert.Equal(Circuit.Model.Rules.Sum(one => one.Findings.Count), await open.Page.Locator(".f").CountAsync());
        Assert.Empty(open.Complaints);
    }

    /// <summary>The texts of the printed pages, without blanks.</summary>
    private static async Task<IReadOnlyList<string>> Print(OpenPage open, string name)
    {
        var file = Reports.NewFile(name);
        await open.Page.PdfAsync(new PagePdfOptions { Path = file, PreferCSSPageSize = true });
        using var pdf = PdfDocument.Open(file);
        Assert.Equal((595, 842), (Math.Round(pdf.GetPage(1).Width), Math.Round(pdf.GetPage(1).Height)));
        return [.. pdf.GetPages().Select(page => Squeezed(string.Concat(page.Letters.Select(letter => letter.Value))))];
    }

    private static string SentenceOf(ReportFinding finding) => Squeezed(finding.Sentence.Replace("`", "", StringComparison.Ordinal));

    private static string Squeezed(string text) => text.Replace(" ", "", StringComparison.Ordinal);
}
