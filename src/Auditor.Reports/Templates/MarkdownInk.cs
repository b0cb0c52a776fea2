using System.Text;

namespace Auditor.Reports.Templates;

/// <summary>Markdown as the common web services for source code render it, tables included.</summary>
internal sealed class MarkdownInk : Ink
{
    private const string AlwaysEscaped = "\\`*[]|~$";

    public override string Inert(string text, bool startsBlock)
    {
        var line = OneLine(text);
        var inert = new StringBuilder(line.Length + 8);
        for (var i = 0; i < line.Length; i++)
        {
            inert.Append(line[i] switch
            {
                '<' => "&lt;",
                '&' when i + 1 < line.Length && (char.IsAsciiLetter(line[i + 1]) || line[i + 1] == '#') => "&amp;",
                var c when NeedsBackslash(line, i) => "\\" + c,
                var c => c.ToString(),
            });
        }

        return startsBlock ? WithoutBlockStart(inert.ToString().TrimStart(' ')) : inert.ToString();
    }

    public override string Code(string text)
    {
        var line = OneLine(text).Trim(' ');
        return line.Length == 0 || line.AsSpan().ContainsAny('`', '|') ? $"<code>{Inert(text, startsBlock: false)}</code>" : $"`{line}`";
    }

    /// <summary>Backquotes in pairs set off code; a lone one is shown as it is.</summary>
    public override string Prose(string text)
    {
        var parts = text.Split('`');
        return parts.Length % 2 == 0
            ? Inert(text, startsBlock: true)
            : string.Concat(parts.Select((part, index) => index % 2 == 1 ? Code(part) : Inert(part, startsBlock: index == 0)));
    }

    public override string Finish(string text) => text.TrimEnd('\n') + "\n";

    private static bool NeedsBackslash(string line, int i) => line[i] switch
    {
        '_' => !(IsInWord(line, i - 1) && IsInWord(line, i + 1)),
        '#' => i == 0 || line[i - 1] == ' ',
        ':' => line.AsSpan(i + 1).StartsWith("//"),
        '.' => line.AsSpan(0, i).EndsWith("www", StringComparison.OrdinalIgnoreCase),
        var c => AlwaysEscaped.Contains(c),
    };

    private static bool IsInWord(string line, int i) => i >= 0 && i < line.Length && char.IsLetterOrDigit(line[i]);

    /// <summary>Takes from the start what would open a list, a quotation, a heading or a rule.</summary>
    private static string WithoutBlockStart(string text)
    {
        if (text is ['-' or '+' or '>' or '=', ..])
        {
            return "\\" + text;
        }

        var digits = text.Length - text.AsSpan().TrimStart("0123456789").Length;
        return digits > 0 && digits < text.Length && text[digits] is '.' or ')' ? text.Insert(digits, "\\") : text;
    }
}
