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

    /// <summary>Text in which backquotes set off names, as the sentences of rules and absences write it.</summary>
    public virtual string Prose(string text) => Inert(text, startsBlock: true);

    /// <summary>The last touch to a whole report.</summary>
    public abstract string Finish(string text);

    /// <summary>What tells where the next text will stand; null for a format in which text may stand anywhere.</summary>
    public virtual WrittenHtml? Watch() => null;

    /// <summary>
    /// One line: each break, with the blanks around it, becomes one blank; � stands for characters that show nothing or turn the text around.
    /// </summary>
    internal static string OneLine(string text)
    {
        var line = new StringBuilder(text.Length);
        var afterBreak = false;
        foreach (var rune in text.EnumerateRunes())
        {
            var isBreak = rune.Value is '\t' or '\n' or '\r' or 0x85 or 0x2028 or 0x2029;
            if (isBreak && !afterBreak)
            {
                TrimEnd(line).Append(' ');
            }
            else if (!isBreak && !(afterBreak && rune.Value == ' '))
            {
                line.Append(IsShown(rune) ? rune.ToString() : "\uFFFD");
            }

            afterBreak = isBreak || (afterBreak && rune.Value == ' ');
        }

        return line.ToString();
    }

    private static StringBuilder TrimEnd(StringBuilder line)
    {
        while (line.Length > 0 && line[^1] == ' ')
        {
            line.Length--;
        }

        return line;
    }

    private static bool IsShown(Rune rune) => Rune.GetUnicodeCategory(rune) is not (UnicodeCategory.Control or UnicodeCategory.Format
        or UnicodeCategory.Surrogate or UnicodeCategory.PrivateUse or UnicodeCategory.OtherNotAssigned);
}
