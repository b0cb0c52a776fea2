using System.Buffers;
using YamlDotNet.Core;

namespace Auditor.Documents;

/// <summary>Puts faults of YAML syntax in our own words, by what the parser's message holds.</summary>
internal static class SyntaxProblems
{
    private const string Code = "yaml-syntax";
    private const string EscapeHelp = "write `\\\\` for a backslash, or use single quotes";

    private static readonly SearchValues<char> Indicators = SearchValues.Create(" \t\r\n:,-?");

    private static readonly (string Holds, string Message, string Help)[] Wordings =
    [
        ("multiline plain scalar", "a key where the text of the line before goes on",
            "put a blank after the colon of the line before, or indent this key like its neighbours"),
        ("invalid mapping", "a second key on the same line, or a key that is indented too far",
            "indent the key like its neighbours; put quotes around a value that holds `: `"),
        ("Mapping values are not allowed", "a colon where no value can follow", "put quotes around a text that holds `: `, and indent keys alike"),
        ("Mapping keys are not allowed", "a `?` where no key can start", "put quotes around a text that starts with `?`"),
        ("Block sequence entries are not allowed", "a dash where no list item can start",
            "start the list on the next line, or put quotes around a text that starts with `- `"),
        ("expected key", "a `key: value` line is expected here", "indent the line like the keys above it, and look for a missing colon or quote"),
        ("expected '-' indicator", "a list item is expected here", "start the line with `- `, or indent it like the keys of the item above"),
        ("could not find expected ':'", "a key without its colon", "write `key: value`; a key stands on one line"),
        ("expected ',' or '}'", "a comma or `}` is expected here", "separate the entries by commas and close the brace"),
        ("expected ',' or ']'", "a comma or `]` is expected here", "separate the items by commas and close the bracket"),
        ("expected node content", "a value is expected here", "write the value, or close what was opened before"),
        ("quoted scalar, found unexpected end of stream", "the quoted text that starts here is not closed", "add the closing quote"),
        ("unexpected document indicator", "the quoted text is not closed before the document ends", "add the closing quote"),
        ("unknown escape", "an escape that means nothing", EscapeHelp),
        ("hexadecimal", "an escape without its hexadecimal digits", EscapeHelp),
        ("Unicode", "an escape that names no character", EscapeHelp),
        ("cannot start any token", "a character that no value can start with", "put quotes around the value"),
        ("block scalar", "the text block does not start or indent as it should", "put nothing after `|` or `>`, and indent all its lines alike"),
        ("wrong indentation", "the quoted text that starts here is not closed on its line", "add the closing quote, or indent its further lines"),
        ("directive", "a directive that cannot be read", "directives are not used here: remove the line"),
        ("comment", "a comment that does not stand apart", "put a blank before the `#`"),
        ("anchor", "an anchor or alias that cannot be read", "anchors and aliases are not used here: write the value out"),
        ("alias", "an anchor or alias that cannot be read", "anchors and aliases are not used here: write the value out"),
        ("tag", "a tag that cannot be read", "tags are not used here: put quotes around a value that starts with `!`"),
        ("YAML document", "a directive that cannot be read", "directives are not used here: remove the line"),
        ("<document start>", "something is left over after the end of the value", "indent it as part of the value, or remove it"),
        ("<document end>", "something is left over after the end of the value", "indent it as part of the value, or remove it"),
    ];

    /// <summary>Words a fault that the parser has placed.</summary>
    /// <param name="source">The text.</param>
    /// <param name="fault">What the parser says.</param>
    /// <param name="openBracket">The innermost bracket still open, if any.</param>
    public static Problem Word(SourceText source, YamlException fault, SourceSpan? openBracket)
    {
        var start = (int)Math.Clamp(fault.Start.Index, 0, source.Text.Length);
        var end = (int)Math.Clamp(fault.End.Index, start, source.Text.Length);
        if (fault.Message.Contains("tab", StringComparison.Ordinal) && source.Text.IndexOf('\t', start) is var tab and >= 0)
        {
            return Make("a tab where only blanks may indent", new SourceSpan(source, tab, tab + 1), "replace it by blanks", openBracket);
        }

        if (start < source.Text.Length && source.Text[start] is ']' or '}' && openBracket is null)
        {
            return Make("a bracket is closed that was not opened", new SourceSpan(source, start, start + 1), "remove it, or open it before", null);
        }

        var (_, message, help) = Array.Find(Wordings, wording => fault.Message.Contains(wording.Holds, StringComparison.OrdinalIgnoreCase));
        return Make(message ?? "the text is not YAML from here on", new SourceSpan(source, start, end),
            help ?? "look for a missing quote, bracket or colon, or for uneven indentation", openBracket);
    }

    /// <summary>Words a fault that the parser has not placed: it lies in the value that follows a place.</summary>
    public static Problem Unplaced(SourceText source, int after, SourceSpan? openBracket)
    {
        var blank = source.Text.AsSpan(after).IndexOfAnyExcept(Indicators);
        var start = blank < 0 ? after : after + blank;
        var span = new SourceSpan(source, start, Math.Min(start + 1, source.Text.Length));
        return (openBracket ?? span).Text switch
        {
            "[" or "{" => Make("the bracket that opens here is not closed, or what it holds is not YAML", openBracket ?? span,
                "close it, and separate what it holds by commas", null),
            "\"" => Make("the quoted text holds an escape that names no character", span, EscapeHelp, null),
            _ => Make("the text is not YAML from here on", span, "look for a missing quote, bracket or colon, or for uneven indentation", null),
        };
    }

    private static Problem Make(string message, SourceSpan span, string help, SourceSpan? openBracket)
        => Problem.Error(Code, message, span, help, openBracket is { } bracket ? [new ProblemLabel(bracket, "this bracket is still open")] : []);
}
