using System.Globalization;
using System.Text;

namespace Auditor.Reports.Templates;

/// <summary>How text is put into a report of one format, so that nothing it says is taken for markup.</summary>
internal abstract class Ink
{
    /// <summary>Text that is shown as it is.</summary>
    /// <param name="text">The text; line breaks count as blanks.</param>
    /// <param name="startsBlock">Whether it stands at the start of a line or list item.</param>
    public abstract string Inert(string text, bool startsBlock);

    /// <summary>Text that is shown as code.</summary>
    public abstract string Code(string text);

    /// <summary>The last touch to a whole report.</summary>
    public abstract string Finish(string text);

    /// <summary>One line, with � for characters that show nothing or turn the text around.</summary>
    protected static string OneLine(string text)
    {
        var line = new StringBuilder(text.Length);
        foreach (var rune in text.EnumerateRunes())
        {
            if (Rune.IsWhiteSpace(rune) && rune.Value != '\u00A0' && rune.Value != '\u202F')
            {
                line.Append(line.Length == 0 || line[^1] == ' ' ? "" : " ");
            }
            else
            {
                line.Append(IsShown(rune) ? rune.ToString() : "\uFFFD");
            }
        }

        return line.ToString().TrimEnd(' ');
    }

    private static bool IsShown(Rune rune) => Rune.GetUnicodeCategory(rune) is not (UnicodeCategory.Control or UnicodeCategory.Format
        or UnicodeCategory.Surrogate or UnicodeCategory.PrivateUse or UnicodeCategory.OtherNotAssigned);
}
