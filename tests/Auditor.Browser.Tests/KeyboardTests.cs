namespace Auditor.Browser.Tests;

/// <summary>The page by keyboard alone.</summary>
public class KeyboardTests(Chromium chromium)
{
    [Fact]
    public async Task The_keys_reach_the_filter_a_rule_a_finding_and_its_workings()
    {
        await using var open = await chromium.Open(Reports.OfExample("one-circuit/one-circuit.design.yaml").Path);

        await open.Page.Keyboard.PressAsync("Tab");
        Assert.Equal("Skip to what needs action", await open.Get<string>("document.activeElement.textContent"));
        await open.Page.Keyboard.PressAsync("Enter");
        await open.Until("document.activeElement.id === 'main'");

        await TabTo(open, ".filter [value=conforms]");
        await open.Page.Keyboard.PressAsync("Space");
        await open.Until("document.querySelectorAll('.f.off').length > 0");
        await open.Page.Keyboard.PressAsync("Space");
        await open.Until("document.querySelectorAll('.f.off').length === 0");

        await TabTo(open, ".rule[data-clause='automatic disconnection'] > summary");
        await open.Page.Keyboard.PressAsync("Enter");
        await TabTo(open, "#f-disconnection-tn__GO_-1 > summary");
        await open.Page.Keyboard.PressAsync("Enter");
        Assert.True(await open.Get<bool>("document.activeElement.parentElement.open"));

        await TabTo(open, "#f-disconnection-tn__GO_-1 .from a");
        await open.Page.Keyboard.PressAsync("Enter");
        await open.Until("document.querySelector('.w:target')?.closest('details').open === true");
    }

    private static async Task TabTo(OpenPage open, string selector)
    {
        for (var presses = 0; presses < 300; presses++)
        {
            await open.Page.Keyboard.PressAsync("Tab");
            if (await open.Page.EvaluateAsync<bool>("selector => document.activeElement.matches(selector)", selector))
            {
                return;
            }
        }

        Assert.Fail($"300 presses of Tab do not reach {selector}");
    }
}
