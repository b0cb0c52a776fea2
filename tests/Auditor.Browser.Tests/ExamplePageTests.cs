using Auditor.Reports.Tests;
using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using Microsoft.Playwright;

namespace Auditor.Browser.Tests;

/// <summary>What holds of the page of every example.</summary>
public class ExamplePageTests(Chromium chromium)
{
    /// <summary>
    /// Unfolds everything and leaves a few of each kind that repeats: the same markup a thousand times over tells nothing new, and takes
    /// axe minutes.
    /// </summary>
    private const string ThinOut = """
        () => {
          const keep = (within, kind, most) => document.querySelectorAll(within).forEach(one => [...one.querySelectorAll(':scope > ' + kind)].slice(most).forEach(extra => extra.remove()));
          const kinds = new Set();
          document.querySelectorAll('figure').forEach(one => kinds.has(one.className) ? one.remove() : kinds.add(one.className));
          keep('#findings', '.rule', 6);
          keep('.rule', '.f', 2);
          keep('#workings', '.book:not(:last-child)', 2);
          keep('.book', '.w', 3);
          keep('.definitions', 'dt, dd', 6);
          keep('.from ul, .fold ul', 'li', 3);
          keep('tbody', 'tr', 12);
          document.querySelectorAll('details').forEach(one => { one.open = true; });
        }
        """;

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
        await open.Page.EvaluateAsync(ThinOut);

        var light = await open.Page.RunAxe();
        await open.Page.EmulateMediaAsync(new PageEmulateMediaOptions { ColorScheme = ColorScheme.Dark });
        var dark = await open.Page.RunAxe(new AxeRunOptions { RunOnly = RunOnlyOptions.Rules("color-contrast", "link-in-text-block") });
        await open.Page.SetViewportSizeAsync(360, 740);
        var width = await open.Get<int>("document.documentElement.scrollWidth");

        Assert.Equal("", Told(light));
        Assert.Equal("", Told(dark));
        Assert.Equal(360, width);
        Assert.Equal(0, shift, 3);
        Assert.Empty(open.Complaints);
        Assert.Single(open.Requests);
    }

    private static string Told(AxeResult result) => string.Join('\n', result.Violations.Select(violation =>
        $"{violation.Id}: {violation.Help}: {string.Join(" | ", violation.Nodes.Take(3).Select(node => node.Html))} ({violation.Nodes.Length})"));
}
