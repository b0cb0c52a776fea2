using Auditor.Browser.Tests;
using Microsoft.Playwright;

[assembly: AssemblyFixture(typeof(Chromium))]

namespace Auditor.Browser.Tests;

/// <summary>The Chromium of the system, started once for all tests; nothing is downloaded.</summary>
public sealed class Chromium : IAsyncLifetime
{
    private IPlaywright? _playwright;

    /// <summary>The browser.</summary>
    public IBrowser Browser { get; private set; } = null!;

    /// <inheritdoc/>
    public async ValueTask InitializeAsync()
    {
        _playwright = await Playwright.CreateAsync();
        Browser = await _playwright.Chromium.LaunchAsync(new BrowserTypeLaunchOptions
        {
            ExecutablePath = Find(),
            Args = ["--no-sandbox", "--disable-gpu"],
        });
    }

    /// <inheritdoc/>
    public async ValueTask DisposeAsync()
    {
        await Browser.DisposeAsync();
        _playwright?.Dispose();
    }

    /// <summary>Opens a file in a window of its own, and waits until all of it has been put in.</summary>
    /// <param name="path">Full path of the file.</param>
    /// <param name="options">How the window is; null for a desktop one.</param>
    /// <param name="fragment">What follows <c>#</c> in the address.</param>
    public async Task<OpenPage> Open(string path, BrowserNewContextOptions? options = null, string fragment = "")
    {
        var page = await NewPage(options);
        await page.Go(path, fragment);
        if (options?.JavaScriptEnabled != false)
        {
            await page.Until("document.querySelector('main noscript') === null");
        }

        return page;
    }

    /// <summary>Opens a file in a browser that has no time for what can wait, until the script <c>haveTime()</c> gives it some.</summary>
    /// <param name="path">Full path of the file.</param>
    /// <param name="fragment">What follows <c>#</c> in the address.</param>
    public async Task<OpenPage> OpenBusy(string path, string fragment = "")
    {
        var page = await NewPage(null);
        await page.Page.AddInitScriptAsync("requestIdleCallback = act => { window.haveTime = () => act({ timeRemaining: () => 50 }); };");
        await page.Go(path, fragment);
        return page;
    }

    private async Task<OpenPage> NewPage(BrowserNewContextOptions? options)
    {
        var context = await Browser.NewContextAsync(options ?? new BrowserNewContextOptions { ViewportSize = new ViewportSize { Width = 1280, Height = 900 } });
        return new OpenPage(context, await context.NewPageAsync());
    }

    private static string Find() =>
        Environment.GetEnvironmentVariable("PATH")!.Split(Path.PathSeparator)
            .SelectMany(folder => new[] { Path.Combine(folder, "chromium"), Path.Combine(folder, "chromium-browser") })
            .FirstOrDefault(File.Exists)
        ?? throw new InvalidOperationException("Chromium is not installed; tests/run.sh installs it");
}
