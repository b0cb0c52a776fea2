using System.Globalization;
using Auditor.Documents;
using Scriban.Parsing;

namespace Auditor.Formulas.Binding;

/// <summary>
/// Looks at the tokens of a formula before it is parsed. Refuses what the parser passes over in silence (comments, <c>?.</c>), what it
/// reads in a way of its own (<c>0x1F</c>), and numbers too large for it to work out in any reasonable time (<c>1e99999999</c>).
/// </summary>
internal static class FormulaTokens
{
    /// <summary>Adds a problem for each token that may not stand in a formula; whether there was none.</summary>
    /// <param name="source">The scalar that holds the formula.</param>
    /// <param name="text">Its text with line breaks as blanks.</param>
    /// <param name="options">How the parser will read it.</param>
    /// <param name="problems">Receives what is wrong.</param>
    public static bool Check(ScalarNode source, string text, LexerOptions options, Problems problems)
    {
        var sound = true;
        foreach (var token in new Lexer(text, "formula", options))
        {
            if (token.Type == TokenType.Eof)
            {
                break;
            }

            if (Fault(source, token) is { } problem)
            {
                problems.Add(problem);
                sound = false;
            }
        }

        return sound;
    }

    private static Problem? Fault(ScalarNode source, Token token)
    {
        var start = token.Start.Offset;
        var written = source.Text[start..Math.Min(token.End.Offset + 1, source.Text.Length)];
        var span = FormulaParser.SpanOf(source, start, start + written.Length);
        return token.Type switch
        {
            TokenType.Comment or TokenType.CommentMulti => FormulaMessages.NotAllowed(span, "a comment"),
            TokenType.SemiColon or TokenType.QuestionDot => FormulaMessages.NotAllowed(span, $"`{written}`"),
            TokenType.VerbatimString => FormulaMessages.NotAllowed(span, "a text between backquotes"),
            TokenType.HexaInteger or TokenType.BinaryInteger or TokenType.Integer or TokenType.Float => NumberFault(span, written),
            _ => null,
        };
    }

    private static Problem? NumberFault(Auditor.Documents.SourceSpan span, string written)
    {
        if (!double.TryParse(written, NumberStyles.AllowDecimalPoint | NumberStyles.AllowExponent, CultureInfo.InvariantCulture, out var number))
        {
            return FormulaMessages.NumberSuffix(span, written);
        }

        return double.IsFinite(number) ? null : FormulaMessages.NumberTooLarge(span);
    }
}
