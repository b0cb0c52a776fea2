namespace Auditor.Browser.Tests;

/// <summary>The page of a big building. Nothing else runs meanwhile, for a time is taken.</summary>
[Collection(nameof(Alone))]
public class LargePageTests(Chromium chromium)
{
    private const int MostBytes = 5_000_000;
    private const int MostMilliseconds = 200;

    private const string LongestTask = """
        () => new Promise(told => {
          const observer = new PerformanceObserver(() => {});
          observer.observe({ type: 'longtask', buffered: true });
          setTimeout(() => told(Math.max(0, ...observer.takeRecords().map(entry => entry.duration))), 500);
        })
        """;

    [Fact]
    public async Task Six_hundred_circuits_stay_small_and_open_without_a_long_task()
    {
        var design = Reports.NewFile("large.design.yaml");
        await File.WriteAllTextAsync(design, LargeDesign.Text(600), TestContext.Current.CancellationToken);
        var page = Reports.OfDesign(design);

        // A machine that is busy with something else can only make it longer: the shortest of several openings counts.
        var longest = double.PositiveInfinity;
        for (var opening = 0; opening < 5 && longest >= MostMilliseconds; opening++)
        {
            await using var open = await chromium.Open(page.Path);
            longest = Math.Min(longest, await open.Get<double>(LongestTask));
        }

        TestContext.Current.TestOutputHelper?.WriteLine($"{page.Bytes} bytes, longest task {longest} ms");
        Assert.True(page.Bytes < MostBytes, $"the page has {page.Bytes} bytes");
        Assert.True(longest < MostMilliseconds, $"opening it takes a task of {longest} ms");
    }
}
