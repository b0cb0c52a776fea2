using Microsoft.Playwright;

namespace Auditor.Browser.Tests;

/// <summary>A page in a window of its own, with what the browser complained of and asked for.</summary>
public sealed class OpenPage : IAsyncDisposable
{
    private readonly IBrowserContext _context;
    private readonly List<string> _complaints = [];
    private readonly List<string> _requests = [];

    internal OpenPage(IBrowserContext context, IPage page)
    {
        _context = context;
        Page = page;
        page.Console += (_, message) =>
        {
            if (message.Type is "error" or "warning")
            {
                _complaints.Add(message.Text);
            }
        };
        page.PageError += (_, error) => _complaints.Add(error);
        page.Dialog += (_, dialog) =>
        {
            _complaints.Add("dialog: " + dialog.Message);
            _ = dialog.DismissAsync();
        };
        page.Request += (_, request) => _requests.Add(request.Url);
    }

    /// <summary>The page.</summary>
    public IPage Page { get; }

    /// <summary>Errors and warnings of the console, failures of scripts, dialogs.</summary>
    public IReadOnlyList<string> Complaints => _complaints;

    /// <summary>The addresses that were asked for, the page itself included.</summary>
    public IReadOnlyList<string> Requests => _requests;

    /// <summary>What an expression of the page gives.</summary>
    public Task<T> Get<T>(string script) => Page.EvaluateAsync<T>(script);

    /// <summary>Waits until a condition of the page holds, ten seconds at most. The page's policy forbids what Playwright's own waiting does.</summary>
    public async Task Until(string condition)
    {
        for (var looks = 0; !await Get<bool>(condition); looks++)
        {
            Assert.True(looks < 200, $"it never came to be that {condition}");
            await Task.Delay(50);
        }
    }

    /// <inheritdoc/>
    public async ValueTask DisposeAsync() => await _context.DisposeAsync();

    internal Task Go(string path, string fragment) => Page.GotoAsync(
        new Uri(path).AbsoluteUri + (fragment.Length == 0 ? "" : "#" + fragment), new PageGotoOptions { WaitUntil = WaitUntilState.Load, Timeout = 120_000 });
}
