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

    /// <summary>Opens a file in a window of its own.</summary>
    /// <param name="path">Full path of the file.</param>
    /// <param name="options">How the window is; null for a desktop one.</param>
    /// <param name="fragment">What follows <c>#</c> in the address.</param>
    public async Task<OpenPage> Open(string path, BrowserNewContextOptions? options = null, string fragment = "")
    {
        var context = await Browser.NewContextAsync(options ?? new BrowserNewContextOptions { ViewportSize = new ViewportSize { Width = 1280, Height = 900 } });
        var page = new OpenPage(context, await context.NewPageAsync());
        await page.Go(new Uri(path).AbsoluteUri + (fragment.Length == 0 ? "" : "#" + fragment));
        return page;
    }

    private static string Find() =>
        Environment.GetEnvironmentVariable("PATH")!.Split(Path.PathSeparator)
            .SelectMany(folder => new[] { Path.Combine(folder, "chromium"), Path.Combine(folder, "chromium-browser") })
            .FirstOrDefault(File.Exists)
        ?? throw new InvalidOperationException("Chromium is not installed; tests/run.sh installs it");
}
