using Deque.AxeCore.Commons;
using Deque.AxeCore.Playwright;
using Microsoft.Playwright;

namespace Auditor.Browser.Tests;

/// <summary>What axe says of a page.</summary>
internal static class Accessibility
{
    /// <summary>
    /// Unfolds everything and leaves a few of each kind that repeats: the same markup a thousand times over tells nothing new, and takes
    /// axe minutes.
    /// </summary>
    public const string ThinOut = """
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

    /// <summary>What it finds wrong in light, and, of the rules for colours, in dark; empty for nothing.</summary>
    public static async Task<(string Light, string Dark)> FaultsOf(IPage page)
    {
        var light = await page.RunAxe();
        await page.EmulateMediaAsync(new PageEmulateMediaOptions { ColorScheme = ColorScheme.Dark });
        return (Told(light), Told(await page.RunAxe(new AxeRunOptions { RunOnly = RunOnlyOptions.Rules("color-contrast", "link-in-text-block") })));
    }

    private static string Told(AxeResult result) => string.Join('\n', result.Violations.Select(violation =>
        $"{violation.Id}: {violation.Help}: {string.Join(" | ", violation.Nodes.Take(3).Select(node => node.Html))} ({violation.Nodes.Length})"));
}
