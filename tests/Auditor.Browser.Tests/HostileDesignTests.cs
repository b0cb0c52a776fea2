using Auditor.Testing;

namespace Auditor.Browser.Tests;

/// <summary>A design whose names and notes are markup.</summary>
public class HostileDesignTests(Chromium chromium)
{
    [Fact]
    public async Task Markup_in_a_design_is_shown_and_does_nothing()
    {
        var page = Reports.OfDesign(Repository.PathOf("tests/Auditor.Reports.Tests/data/designs/hostile.design.yaml"));

        await using var open = await chromium.Open(page.Path);

        var text = await open.Get<string>("document.body.textContent");
        Assert.Contains("</details><script>alert(1)</script>", text, StringComparison.Ordinal);
        Assert.Contains("<img src=x>", text, StringComparison.Ordinal);
        Assert.Equal(1, await open.Get<int>("document.scripts.length"));
        Assert.Equal(0, await open.Get<int>("document.querySelectorAll('img, iframe, object, embed, base, form[action]').length"));
        Assert.Equal(0, await open.Get<int>("[...document.querySelectorAll('*')].filter(one => [...one.attributes].some(a => a.name.startsWith('on'))).length"));
        Assert.Empty(await open.Get<string[]>("[...document.links].map(link => link.getAttribute('href')).filter(href => !href.startsWith('#'))"));
        Assert.Empty(open.Complaints);
        Assert.Single(open.Requests);
    }
}
