using Auditor.Reports.Tests;

namespace Auditor.Browser.Tests;

/// <summary>What holds of the page of every example.</summary>
public class ExamplePageTests(Chromium chromium)
{
    private const string ShiftOfLayout = """
        () => new Promise(told => new PerformanceObserver(list => told(list.getEntries().reduce((sum, entry) => sum + entry.value, 0)))
          .observe({ type: 'layout-shift', buffered: true }) || setTimeout(() => told(0), 300))
        """;

    public static TheoryData<string> Examples => [.. ExampleAudit.All];

    [Theory]
    [MemberData(nameof(Examples))]
    public async Task A_page_asks_for_nothing_complains_of_nothing_and_is_accessible_in_light_and_dark(string example)
    {
        await using var open = await chromium.Open(Reports.OfExample(example).Path);
        var shift = await open.Get<double>(ShiftOfLayout);
        await open.Page.EvaluateAsync(Accessibility.ThinOut);

        var (light, dark) = await Accessibility.FaultsOf(open.Page);
        await open.Page.SetViewportSizeAsync(360, 740);
        var width = await open.Get<int>("document.documentElement.scrollWidth");

        Assert.Equal("", light);
        Assert.Equal("", dark);
        Assert.Equal(360, width);
        Assert.Equal(0, shift, 3);
        Assert.Empty(open.Complaints);
        Assert.Single(open.Requests);
    }
}
