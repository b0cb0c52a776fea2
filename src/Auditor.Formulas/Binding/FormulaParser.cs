using Auditor.Documents;
using Scriban;
using Scriban.Parsing;
using Scriban.Syntax;
using SourceSpan = Auditor.Documents.SourceSpan;

namespace Auditor.Formulas.Binding;

/// <summary>Reads the text of a formula with Scriban's expression parser; only its tree is used, never its evaluation.</summary>
internal static class FormulaParser
{
    public const int MostCharacters = 2000;

    /// <summary>Terms within one another at the most, a chain of operators included; keeps binding and evaluation within the stack.</summary>
    public const int MostDeep = 60;

    private static readonly ParserOptions Options = new() { ExpressionDepthLimit = MostDeep };
    private static readonly LexerOptions Lexing = new() { Mode = ScriptMode.ScriptOnly, Lang = ScriptLang.Scientific };

    /// <summary>The expression, or null with a problem added.</summary>
    public static ScriptExpression? Parse(ScalarNode source, Problems problems)
    {
        var text = source.Text;
        if (string.IsNullOrWhiteSpace(text))
        {
            problems.Add(FormulaMessages.Empty(source.Span));
            return null;
        }

        if (text.Length > MostCharacters)
        {
            problems.Add(FormulaMessages.TooLong(source.Span, MostCharacters));
            return null;
        }

        // A formula is one expression, so a line break in it means no more than a blank.
        text = text.Replace('\n', ' ');
        if (!FormulaTokens.Check(source, text, Lexing, problems))
        {
            return null;
        }

        var template = Template.Parse(text, "formula", Options, Lexing);
        if (template.HasErrors)
        {
            problems.Add(ErrorOf(source, template.Messages[0]));
            return null;
        }

        var statements = template.Page!.Body!.Statements;
        if (statements.Count == 1 && statements[0] is ScriptExpressionStatement { Expression: { } expression })
        {
            return expression;
        }

        var place = statements.Count == 0 ? source.Span : NodeSpan(source, statements[^1]);
        problems.Add(FormulaMessages.NotAllowed(place, statements.Count > 1 ? "a second statement" : "this statement"));
        return null;
    }

    /// <summary>Where a node stands in the rule file.</summary>
    public static SourceSpan NodeSpan(ScalarNode source, ScriptNode node)
    {
        var start = node.Span.Start.Offset;
        var end = node is ScriptFunctionCall call ? EndOfCall(source.Text, call) : node.Span.End.Offset + 1;
        return SpanOf(source, start, end);
    }

    /// <summary>A call ends with its closing bracket; the parser's own span may stop one short of it.</summary>
    private static int EndOfCall(string text, ScriptFunctionCall call)
    {
        var from = call.Arguments.Count == 0 ? call.Target!.Span.End.Offset + 1 : LastEnd(text, call.Arguments[^1]);
        var close = from < text.Length ? text.IndexOf(')', from) : -1;
        return close < 0 ? call.Span.End.Offset + 1 : close + 1;
    }

    private static int LastEnd(string text, ScriptNode node) => node switch
    {
        ScriptFunctionCall call => EndOfCall(text, call),
        ScriptBinaryExpression { Right: { } right } => LastEnd(text, right),
        ScriptUnaryExpression { Right: { } right } => LastEnd(text, right),
        _ => node.Span.End.Offset + 1,
    };

    private static Problem ErrorOf(ScalarNode source, LogMessage error)
    {
        var span = SpanOfError(source, error.Span);
        return error.Message.Contains("depth limit", StringComparison.Ordinal) ? FormulaMessages.TooDeep(span, MostDeep) : FormulaMessages.Unreadable(span);
    }

    /// <summary>The parser places an error at the end of the formula before its start.</summary>
    private static SourceSpan SpanOfError(ScalarNode source, Scriban.Parsing.SourceSpan span) => span.Start.Offset < 0
        ? SpanOf(source, source.Text.Length, source.Text.Length)
        : SpanOf(source, span.Start.Offset, Math.Max(span.End.Offset, span.Start.Offset) + 1);

    /// <summary>Where a stretch of the formula stands in the rule file; cut to the formula.</summary>
    public static SourceSpan SpanOf(ScalarNode source, int start, int end)
    {
        var from = Math.Clamp(start, 0, source.Text.Length);
        return source.SpanOf(from, Math.Clamp(end, from, source.Text.Length) - from);
    }
}
