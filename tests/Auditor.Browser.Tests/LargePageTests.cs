namespace Auditor.Browser.Tests;

/// <summary>The page of a big building.</summary>
public class LargePageTests(Chromium chromium)
{
    private const int MostBytes = 5_000_000;

    [Fact]
    public async Task Six_hundred_circuits_stay_small_and_open_with_every_finding()
    {
        var design = Reports.NewFile("large.design.yaml");
        await File.WriteAllTextAsync(design, LargeDesign.Text(600), TestContext.Current.CancellationToken);
        var page = Reports.OfDesign(design);

        await using var open = await chromium.Open(page.Path);

        Assert.True(page.Bytes < MostBytes, $"the page has {page.Bytes} bytes");
        Assert.Equal(page.Model.Rules.Sum(rule => rule.Findings.Count), await open.Get<int>("document.querySelectorAll('.f').length"));
        Assert.InRange(await open.Get<int>("document.querySelectorAll('.f.line').length"), 1_000, int.MaxValue);
        Assert.Equal(0, await open.Get<int>("[...document.querySelectorAll('.f.line')].filter(line => !line.textContent.includes(': conforms')).length"));
    }
}
