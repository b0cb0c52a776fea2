namespace Auditor.Reports.Pictures.Drawing;

/// <summary>
/// How wide a text may come out. No font is measured, since none is known: the figures are the advance widths of DejaVu Sans, one of the widest
/// of the faces that browsers fall back to, in thousandths of the font size, so that a text that fits by them fits in the others.
/// </summary>
internal static class TextWidth
{
    private const int FirstLetter = ' ';
    private const int Ideograph = 0x2E80;

    private static readonly short[] Letters =
    [
        318, 401, 460, 838, 636, 950, 780, 275, 390, 390, 500, 838, 318, 361, 318, 337, 636, 636, 636, 636, 636, 636, 636, 636, 636, 636, 337, 337, 838,
        838, 838, 531, 1000, 684, 686, 698, 770, 632, 575, 775, 752, 295, 295, 656, 557, 863, 748, 787, 603, 787, 695, 635, 611, 732, 684, 989, 685, 611,
        685, 390, 337, 390, 838, 500, 500, 613, 635, 550, 635, 615, 352, 635, 634, 278, 278, 579, 278, 974, 634, 612, 635, 635, 411, 521, 392, 634, 592,
        818, 592, 592, 525, 636, 337, 636, 838,
    ];

    /// <summary>Width of a text at a font size, in the unit of the size.</summary>
    public static double Of(string text, double size) => text.EnumerateRunes().Sum(rune => Of(rune.Value)) * size / 1000;

    /// <summary>The text, cut with an ellipsis where it would be wider than the room.</summary>
    public static string Fit(string text, double size, double room)
    {
        if (Of(text, size) <= room)
        {
            return text;
        }

        var left = room - Of("…", size);
        var kept = 0;
        foreach (var rune in text.EnumerateRunes())
        {
            left -= Of(rune.Value) * size / 1000;
            if (left < 0)
            {
                break;
            }

            kept += rune.Utf16SequenceLength;
        }

        return text[..kept].TrimEnd() + "…";
    }

    private static double Of(int character) => character switch
    {
        >= FirstLetter when character - FirstLetter < Letters.Length => Letters[character - FirstLetter],
        '·' or '²' or '³' => 401,
        '…' or >= Ideograph => 1000,
        _ => 850,
    };
}
