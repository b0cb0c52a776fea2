using Microsoft.Playwright;

namespace Auditor.Browser.Tests;

/// <summary>What is put in after the page has opened.</summary>
public class LatePartsTests(Chromium chromium)
{
    /// <summary>Elements that a browser is to make in one go: what opens, and each piece that is put in later.</summary>
    internal const int MostAtOnce = 6_000;

    private const string Shown = "document.querySelectorAll('.f:not(.off)').length";

    private const string GreatestPiece = """
        Math.max(...[...document.querySelectorAll('main noscript')].map(piece => {
          const inert = document.createElement('template');
          inert.innerHTML = piece.textContent;
          return inert.content.querySelectorAll('*').length;
        }))
        """;

    private static readonly WrittenPage Circuit = Reports.OfExample("one-circuit/one-circuit.design.yaml");

    private static readonly int Findings = Circuit.Model.Rules.Sum(rule => rule.Findings.Count);

    [Theory]
    [InlineData("bakery/bakery.design.yaml")]
    [InlineData("workshop/workshop.design.yaml")]
    public async Task A_browser_has_little_to_do_at_once(string example)
    {
        await using var open = await chromium.OpenBusy(Reports.OfExample(example).Path);

        Assert.InRange(await open.Get<int>("document.querySelectorAll('*').length"), 500, MostAtOnce);
        Assert.InRange(await open.Get<int>(GreatestPiece), 100, MostAtOnce);
    }

    [Fact]
    public async Task A_notice_stands_where_something_is_to_come_until_it_is_there()
    {
        await using var busy = await chromium.OpenBusy(Circuit.Path);
        await using var whole = await chromium.Open(Circuit.Path);
        await using var without = await chromium.Open(Circuit.Path, new BrowserNewContextOptions { JavaScriptEnabled = false });

        Assert.True(await busy.Page.Locator("#circuits .late").IsVisibleAsync());
        Assert.Equal(0, await whole.Page.Locator(".late").CountAsync());
        Assert.False(await without.Page.Locator("#circuits .late").IsVisibleAsync());
    }

    [Fact]
    public async Task An_address_and_a_link_reach_what_is_not_there_yet()
    {
        const string Finding = "f-disconnection-tn__GO_-1";
        await using var open = await chromium.OpenBusy(Circuit.Path, Finding);

        Assert.True(await open.Get<bool>($"document.getElementById('{Finding}').open"));
        await open.Until($"document.getElementById('{Finding}').getBoundingClientRect().top < innerHeight");

        await open.Page.Locator($"#{Finding} .from a").First.ClickAsync();
        await open.Until("document.querySelector('.w:target')?.closest('details').open === true");
        Assert.NotEqual(0, await open.Get<int>("document.querySelectorAll('main noscript').length"));
    }

    [Fact]
    public async Task What_an_address_leads_to_stays_in_view_while_the_rest_is_put_in()
    {
        var last = Circuit.Model.Rules[^1].Findings[^1].Anchor;
        await using var open = await chromium.Open(Circuit.Path, fragment: last);

        Assert.InRange(await open.Get<double>($"document.getElementById('{last}').getBoundingClientRect().top"), 0, 900);
    }

    [Fact]
    public async Task A_filter_asked_for_too_early_is_applied_when_all_is_there()
    {
        await using var open = await chromium.OpenBusy(Circuit.Path, "?verdict=conforms");
        Assert.Equal("", await open.Get<string>("document.querySelector('.filter [role=status]').textContent"));

        await open.Page.EvaluateAsync("while (document.querySelector('main noscript')) haveTime()");

        var conform = Circuit.Model.Rules.SelectMany(rule => rule.Findings).Count(finding => finding.VerdictWord == "conforms");
        Assert.Equal(conform, await open.Get<int>(Shown));
        Assert.Equal($"{conform} of {Findings} findings", await open.Get<string>("document.querySelector('.filter [role=status]').textContent"));
    }
}
