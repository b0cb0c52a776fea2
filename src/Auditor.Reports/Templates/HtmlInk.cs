using System.Globalization;
using System.Text;

namespace Auditor.Reports.Templates;

/// <summary>
/// HTML: text between tags; <see cref="WrittenHtml.Fit"/> makes it fit for the value of an attribute. Characters beyond ASCII are written as
/// references: a browser reads a large page of nothing but ASCII in half the time.
/// </summary>
internal sealed class HtmlInk : Ink
{
    public override string Inert(string text, bool startsBlock)
    {
        var line = OneLine(text);
        return line.AsSpan().ContainsAny("&<>") ? Narrow(Encode(line)) : Narrow(line);
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

    /// <summary>Markup with the characters beyond ASCII as references.</summary>
    internal static string Narrow(string markup)
    {
        if (Ascii.IsValid(markup))
        {
            return markup;
        }

        var narrow = new StringBuilder(markup.Length + 16);
        foreach (var rune in markup.EnumerateRunes())
        {
            _ = rune.IsAscii ? narrow.Append((char)rune.Value) : narrow.Append(CultureInfo.InvariantCulture, $"&#{rune.Value};");
        }

        return narrow.ToString();
    }

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
