using System.Text;

namespace Auditor.Reports.Templates;

/// <summary>HTML: text between tags; <see cref="WrittenHtml.Fit"/> makes it fit for the value of an attribute.</summary>
internal sealed class HtmlInk : Ink
{
    public override string Inert(string text, bool startsBlock)
    {
        var line = OneLine(text);
        return line.AsSpan().ContainsAny("&<>") ? Encode(line) : line;
    }

    public override string Code(string text) => $"<code>{Inert(text.Trim(' '), startsBlock: false)}</code>";

    /// <summary>Backquotes in pairs set off code; a lone one is shown as it is.</summary>
    public override string Prose(string text)
    {
        var parts = text.Split('`');
        return parts.Length % 2 == 0
            ? Inert(text, startsBlock: false)
            : string.Concat(parts.Select((part, index) => index % 2 == 1 ? Code(part) : Inert(part, startsBlock: false)));
    }

    public override string Finish(string text) => text.TrimEnd('\n') + "\n";

    public override WrittenHtml Watch() => new();

    private static string Encode(string line)
    {
        var inert = new StringBuilder(line.Length + 16);
        foreach (var c in line)
        {
            _ = c switch
            {
                '&' => inert.Append("&amp;"),
                '<' => inert.Append("&lt;"),
                '>' => inert.Append("&gt;"),
                _ => inert.Append(c),
            };
        }

        return inert.ToString();
    }
}
