using Microsoft.Playwright;
using UglyToad.PdfPig;

namespace Auditor.Browser.Tests;

/// <summary>The page as it is printed, and without scripts.</summary>
public class PaperTests(Chromium chromium)
{
    private static readonly WrittenPage Circuit = Reports.OfExample("one-circuit/one-circuit.design.yaml");

    [Theory]
    [InlineData(false)]
    [InlineData(true)]
    public async Task The_print_out_has_every_finding_with_its_derivation_though_all_are_folded_and_some_filtered_away(bool isEarly)
    {
        const string Filtered = "?verdict=undetermined";
        await using var open = isEarly ? await chromium.OpenBusy(Circuit.Path, Filtered) : await chromium.Open(Circuit.Path, fragment: Filtered);
        var file = Reports.NewFile($"one-circuit-{isEarly}.pdf");

        await open.Page.PdfAsync(new PagePdfOptions { Path = file, PreferCSSPageSize = true });

        using var pdf = PdfDocument.Open(file);
        var first = pdf.GetPage(1);
        var text = string.Concat(pdf.GetPages().SelectMany(page => page.Letters).Select(letter => letter.Value)).Replace(" ", "", StringComparison.Ordinal);
        Assert.Equal((595, 842), (Math.Round(first.Width), Math.Round(first.Height)));
        Assert.All(Circuit.Model.Rules, rule => Assert.Contains(Squeezed(rule.Title), text, StringComparison.Ordinal));
        Assert.All(Circuit.Model.Rules.SelectMany(rule => rule.Findings), finding =>
        {
            Assert.Contains(Squeezed($"{finding.SubjectLabel}{finding.Verdict}{finding.Value}"), text, StringComparison.Ordinal);
            Assert.Contains(Squeezed(finding.Sentence.Replace("`", "", StringComparison.Ordinal)), text, StringComparison.Ordinal);
        });
        Assert.All(Circuit.Model.Workings.Subjects, subject => Assert.Contains(Squeezed(subject.Quantities[^1].Name), text, StringComparison.Ordinal));
        Assert.Contains(Squeezed(Circuit.Model.Caution), text, StringComparison.Ordinal);
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

    private static string Squeezed(string text) => text.Replace(" ", "", StringComparison.Ordinal);
}
