namespace Auditor.Reports.Pictures.Drawing;

/// <summary>
/// How wide a text may come out. No font is measured, since none is known: the figures are those of a wide sans-serif face, in hundredths of
/// the font size, so that a text that fits by them fits in the faces that browsers use.
/// </summary>
internal static class TextWidth
{
    private const string Narrow = "iljI.,:;'|!()[]tfr/ -·";
    private const string Wide = "mwMW%@—Ω→…";

    /// <summary>Width of a text at a font size, in the unit of the size.</summary>
    public static double Of(string text, double size) => text.EnumerateRunes().Sum(rune => Of(rune.Value)) * size / 100;

    /// <summary>The text, cut with an ellipsis where it would be wider than the room.</summary>
    public static string Fit(string text, double size, double room)
    {
        if (Of(text, size) <= room)
        {
            return text;
        }

        var left = room - (Of("…", size));
        var kept = 0;
        foreach (var rune in text.EnumerateRunes())
        {
            left -= Of(rune.Value) * size / 100.0;
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
        > 0x2E7F => 105,
        _ when character < char.MaxValue && Narrow.Contains((char)character) => 42,
        _ when character < char.MaxValue && Wide.Contains((char)character) => 102,
        >= 'A' and <= 'Z' => 73,
        > 0x24F => 80,
        _ => 64,
    };
}
