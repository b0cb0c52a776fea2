using System.Diagnostics.CodeAnalysis;
using System.Text.RegularExpressions;

namespace Auditor.Formulas.Terms;

/// <summary>
/// A regular expression that a whole text must match, upper and lower case told apart. The automaton behind it takes time in proportion
/// to the text, whatever the pattern: none can hold up the program. What would need another kind of matching is refused. A text of more
/// than 4000 characters fits no pattern.
/// </summary>
internal sealed class TextPattern
{
    private const int MostCharacters = 200;

    private const int LongestText = 4000;

    /// <summary>Never reached by a text and a pattern of these lengths; a bolt behind the lock.</summary>
    private static readonly TimeSpan Longest = TimeSpan.FromSeconds(30);

    private readonly Regex _expression;

    private TextPattern(Regex expression) => _expression = expression;

    /// <summary>Makes a pattern; false, with the reason, where the text is none.</summary>
    public static bool TryMake(string text, [NotNullWhen(true)] out TextPattern? pattern, out string fault)
    {
        pattern = null;
        fault = $"it is longer than {MostCharacters} characters";
        if (text.Length > MostCharacters)
        {
            return false;
        }

        try
        {
            // The brackets keep alternatives together; the pattern must be one by itself, so that it cannot close them.
            _ = Made(text);
            pattern = new TextPattern(Made($@"\A(?:{text})\z"));
            return true;
        }
        catch (RegexParseException wrong)
        {
            fault = $"{Words(wrong.Error)} at character {wrong.Offset}";
        }
        catch (NotSupportedException)
        {
            fault = "it looks around, refers back or counts too far";
        }

        return false;
    }

    /// <summary>Whether the whole text is what the pattern says.</summary>
    public bool Fits(string text) => text.Length <= LongestText && _expression.IsMatch(text);

    private static Regex Made(string text) => new(text, RegexOptions.NonBacktracking | RegexOptions.CultureInvariant | RegexOptions.ExplicitCapture, Longest);

    /// <summary>The fault without the wording of the library, which depends on the language of the machine.</summary>
    private static string Words(RegexParseError error) => error switch
    {
        RegexParseError.InsufficientClosingParentheses => "a bracket `(` is not closed",
        RegexParseError.InsufficientOpeningParentheses => "a bracket `)` closes nothing",
        RegexParseError.UnterminatedBracket => "a bracket `[` is not closed",
        RegexParseError.QuantifierAfterNothing => "there is nothing to repeat",
        RegexParseError.ReversedCharacterRange => "a range runs backwards",
        RegexParseError.ReversedQuantifierRange => "a number of repetitions runs backwards",
        _ => "it is no regular expression",
    };
}
