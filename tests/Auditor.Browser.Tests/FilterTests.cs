namespace Auditor.Browser.Tests;

/// <summary>Narrowing down the findings.</summary>
public class FilterTests(Chromium chromium)
{
    private const string Shown = "[...document.querySelectorAll('.f:not(.off)')].map(one => one.id)";
    private const string Status = "document.querySelector('.filter [role=status]').textContent";

    private static readonly WrittenPage Bakery = Reports.OfExample("bakery/bakery.design.yaml");

    [Fact]
    public async Task Verdict_clause_type_board_and_text_narrow_the_findings_together()
    {
        await using var open = await chromium.Open(Bakery.Path);
        var all = Bakery.Model.Rules.SelectMany(rule => rule.Findings).ToArray();

        await open.Page.Locator(".filter [value=conforms]").UncheckAsync();
        await Expect(open, [.. all.Where(finding => finding.VerdictWord != "conforms").Select(finding => finding.Anchor)]);

        await open.Page.Locator(".filter [name=board]").SelectOptionAsync("BK");
        await Expect(open, [.. all.Where(finding => finding.VerdictWord != "conforms" && finding.Board == "BK").Select(finding => finding.Anchor)]);

        await open.Page.Locator(".filter [name=clause]").SelectOptionAsync("automatic disconnection");
        await Expect(open, ["f-disconnection-tn__BK_-3"]);

        await open.Page.Locator(".filter [name=text]").FillAsync("no such words");
        await Expect(open, []);
        Assert.True(await open.Page.Locator(".none").IsVisibleAsync());

        await open.Page.Locator(".filter [type=reset]").ClickAsync();
        await Expect(open, [.. all.Select(finding => finding.Anchor)]);
    }

    [Fact]
    public async Task A_filter_is_kept_in_the_address_and_comes_back_with_it()
    {
        await using var first = await chromium.Open(Bakery.Path);
        await first.Page.Locator(".filter [name=text]").FillAsync("spiral dough");
        await first.Until("location.hash !== ''");
        var fragment = new Uri(first.Page.Url).Fragment;

        await using var second = await chromium.Open(Bakery.Path, fragment: fragment[1..]);

        Assert.Equal("#?text=spiral+dough", fragment);
        Assert.Equal("spiral dough", await second.Page.Locator(".filter [name=text]").InputValueAsync());
        var shown = await second.Get<string[]>(Shown);
        Assert.All(shown, id => Assert.Contains("__BK_-3", id, StringComparison.Ordinal));
        Assert.NotEmpty(shown);
    }

    [Fact]
    public async Task A_link_to_a_finding_that_the_filter_hides_shows_and_unfolds_it()
    {
        await using var open = await chromium.Open(Bakery.Path, fragment: "?verdict=departed");
        Assert.Empty(await open.Get<string[]>(Shown));

        await open.Page.Locator(".cards a[href='#f-disconnection-tn__BK_-3']").ClickAsync();
        await open.Until("document.querySelector('#f-disconnection-tn__BK_-3').open");

        Assert.True(await open.Page.Locator("#f-disconnection-tn__BK_-3 .says").IsVisibleAsync());
    }

    private static async Task Expect(OpenPage open, string[] anchors)
    {
        var total = Bakery.Model.Rules.Sum(rule => rule.Findings.Count);
        var status = anchors.Length == total ? $"{total} findings" : $"{anchors.Length} of {total} findings";
        await open.Until($"{Status} === '{status}'");
        Assert.Equal(anchors.Order(StringComparer.Ordinal), (await open.Get<string[]>(Shown)).Order(StringComparer.Ordinal));
    }
}
