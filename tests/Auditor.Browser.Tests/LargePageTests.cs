using System.Text;
using Microsoft.Playwright;

namespace Auditor.Browser.Tests;

/// <summary>The page of a big building.</summary>
public class LargePageTests(Chromium chromium)
{
    private const int MostBytes = 5_000_000;

    private static readonly Lazy<WrittenPage> SixHundred = new(() =>
    {
        var design = Reports.NewFile("large.design.yaml");
        File.WriteAllText(design, LargeDesign.Text(600));
        return Reports.OfDesign(design);
    });

    [Fact]
    public async Task Six_hundred_circuits_stay_small_and_open_with_every_finding()
    {
        var page = SixHundred.Value;

        await using var open = await chromium.Open(page.Path);

        Assert.True(page.Bytes < MostBytes, $"the page has {page.Bytes} bytes");
        Assert.Equal(page.Model.Rules.Sum(rule => rule.Findings.Count), await open.Get<int>("document.querySelectorAll('.f').length"));
        Assert.InRange(await open.Get<int>("document.querySelectorAll('.f.line').length"), 1_000, int.MaxValue);
        Assert.Equal(0, await open.Get<int>("[...document.querySelectorAll('.f.line')].filter(line => !line.textContent.includes(': conforms')).length"));
    }

    [Fact]
    public async Task Six_hundred_circuits_leave_a_browser_little_to_do_before_it_shows_them()
    {
        var page = SixHundred.Value;

        await using var open = await chromium.OpenBusy(page.Path);

        Assert.InRange(await open.Get<int>("document.querySelectorAll('*').length"), 500, LatePartsTests.MostAtOnce);
        Assert.True(Ascii.IsValid(await File.ReadAllBytesAsync(page.Path, TestContext.Current.CancellationToken)), "the page has characters beyond ASCII");
    }

    [Fact]
    public async Task Findings_as_plain_lines_are_accessible()
    {
        await using var open = await chromium.Open(SixHundred.Value.Path);
        await open.Page.EvaluateAsync(Accessibility.ThinOut);

        Assert.NotEqual(0, await open.Get<int>("document.querySelectorAll('.f.line').length"));
        Assert.NotEqual(0, await open.Get<int>("document.querySelectorAll('.f.flat').length"));
        Assert.Equal(("", ""), await Accessibility.FaultsOf(open.Page));
    }

    [Fact]
    public async Task Without_scripts_six_hundred_circuits_have_every_finding()
    {
        var page = SixHundred.Value;

        await using var open = await chromium.Open(page.Path, new BrowserNewContextOptions { JavaScriptEnabled = false });

        Assert.Equal(page.Model.Rules.Sum(rule => rule.Findings.Count), await open.Page.Locator(".f").CountAsync());
    }
}
