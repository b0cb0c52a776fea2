using System.Globalization;
using System.Text;

namespace Auditor.Documents;

/// <summary>A line of text made fit to show, one cell for each character: tabs as a blank, what cannot be shown as �.</summary>
internal sealed class ShownText
{
    private readonly Rune[] _cells;

    private ShownText(Rune[] cells) => _cells = cells;

    /// <summary>How many cells there are.</summary>
    public int Width => _cells.Length;

    public static ShownText Of(ReadOnlySpan<char> text)
    {
        var cells = new List<Rune>(text.Length);
        foreach (var rune in text.EnumerateRunes())
        {
            cells.Add(Shown(rune));
        }

        return new ShownText([.. cells]);
    }

    /// <summary>Returns a part, cut to what there is.</summary>
    public string Cut(int start, int width)
    {
        var from = Math.Clamp(start, 0, Width);
        return string.Concat(_cells.Skip(from).Take(width).Select(rune => rune.ToString()));
    }

    public override string ToString() => Cut(0, Width);

    private static Rune Shown(Rune rune) => Rune.GetUnicodeCategory(rune) switch
    {
        _ when rune.Value == '\t' => new Rune(' '),
        UnicodeCategory.Control or UnicodeCategory.Format or UnicodeCategory.LineSeparator or UnicodeCategory.ParagraphSeparator
            or UnicodeCategory.Surrogate or UnicodeCategory.PrivateUse or UnicodeCategory.OtherNotAssigned => Rune.ReplacementChar,
        _ => rune,
    };
}
