using System.Globalization;
using System.Runtime.InteropServices;
using System.Xml.Linq;

namespace Auditor.Reports.Tests.Pictures;

/// <summary>Where texts and symbols of a picture come to stand.</summary>
internal static class Placement
{
    // Advance widths of DejaVu Sans and DejaVu Sans Bold, letters from the blank to the tilde, in thousandths of the size, from the font files.
    private static readonly int[] Regular =
    [
        318, 401, 460, 838, 636, 950, 780, 275, 390, 390, 500, 838, 318, 361, 318, 337, 636, 636, 636, 636, 636, 636, 636, 636, 636, 636, 337, 337, 838,
        838, 838, 531, 1000, 684, 686, 698, 770, 632, 575, 775, 752, 295, 295, 656, 557, 863, 748, 787, 603, 787, 695, 635, 611, 732, 684, 989, 685, 611,
        685, 390, 337, 390, 838, 500, 500, 613, 635, 550, 635, 615, 352, 635, 634, 278, 278, 579, 278, 974, 634, 612, 635, 635, 411, 521, 392, 634, 592,
        818, 592, 592, 525, 636, 337, 636, 838,
    ];

    private static readonly int[] Bold =
    [
        348, 456, 521, 838, 696, 1002, 872, 306, 457, 457, 523, 838, 380, 415, 380, 365, 696, 696, 696, 696, 696, 696, 696, 696, 696, 696, 400, 400, 838,
        838, 838, 580, 1000, 774, 762, 734, 830, 683, 683, 821, 837, 372, 372, 775, 637, 995, 837, 850, 733, 850, 770, 720, 682, 812, 774, 1103, 771, 724,
        725, 457, 365, 457, 838, 500, 500, 675, 716, 593, 716, 678, 435, 716, 712, 343, 343, 665, 343, 1042, 712, 687, 716, 716, 493, 595, 478, 712, 652,
        924, 645, 652, 582, 712, 365, 712, 838,
    ];

    private static readonly Dictionary<string, (double Left, double Top, double Right, double Bottom)> Symbols = new()
    {
        ["circuit-breaker"] = (-15, -9, 15, 3),
        ["switch"] = (-15, -9, 15, 5),
        ["fuse"] = (-15, -5, 15, 5),
        ["rcd"] = (-4, -8, 4, 8),
        ["load"] = (0, -4, 18, 4),
        ["socket-outlet"] = (0, -8, 17, 8),
        ["luminaire"] = (0, -7, 17, 7),
        ["motor"] = (0, -8, 18, 8),
        ["generator"] = (0, -8, 18, 8),
        ["heater"] = (0, -5, 20, 5),
        ["nonconforming"] = (-7, -7, 7, 7),
        ["advised"] = (-6, -6, 6, 6),
        ["undetermined"] = (-8, -8, 8, 8),
        ["departed"] = (-7.5, -7, 7.5, 6),
        ["conforms"] = (-6.5, -6.5, 6.5, 6.5),
    };

    /// <summary>The texts of a picture with the boxes that they take; those within definitions stand nowhere.</summary>
    public static IReadOnlyList<Box> Texts(XElement svg) => [.. svg.Descendants().Where(element => element.Name.LocalName == "text" && IsShown(element)).Select(OfText)];

    /// <summary>The symbols of a picture that stand upright, with the boxes that they take.</summary>
    public static IReadOnlyList<Box> Uses(XElement svg, string id) =>
        [.. svg.Descendants().Where(element => element.Name.LocalName == "use" && IsShown(element) && element.Parent!.Attribute("transform") is null)
            .Select(use => (Use: use, Name: use.Attribute("href")!.Value[(id.Length + 2)..])).Where(pair => Symbols.ContainsKey(pair.Name))
            .Select(pair => Around(pair.Name, Number(pair.Use, "x"), Number(pair.Use, "y"), Symbols[pair.Name]))];

    /// <summary>Pairs of boxes that lie over one another by more than a tenth.</summary>
    public static IEnumerable<string> Overlaps(IReadOnlyList<Box> boxes)
    {
        var sorted = boxes.OrderBy(box => box.Top).ToArray();
        for (var i = 0; i < sorted.Length; i++)
        {
            for (var j = i + 1; j < sorted.Length && sorted[j].Top < sorted[i].Bottom - 0.1; j++)
            {
                if (sorted[i].Left < sorted[j].Right - 0.1 && sorted[j].Left < sorted[i].Right - 0.1)
                {
                    yield return $"{sorted[i]} and {sorted[j]}";
                }
            }
        }
    }

    public static double Number(XElement element, string name) => double.Parse(element.Attribute(name)!.Value, CultureInfo.InvariantCulture);

    private static bool IsShown(XElement element) => element.Ancestors().All(ancestor => ancestor.Name.LocalName != "defs");

    private static Box Around(string name, double x, double y, (double Left, double Top, double Right, double Bottom) size) =>
        new(name, x + size.Left, y + size.Top, x + size.Right, y + size.Bottom);

    /// <summary>Lower-case letters with descenders reach 0.2 of the size below the line, capitals 0.73 above.</summary>
    private static Box OfText(XElement element)
    {
        var looks = element.Attribute("class")!.Value.Split(' ');
        var text = string.Concat(element.Nodes().OfType<XText>().Select(node => node.Value));
        var size = looks.Contains("p-s") ? 11 : 12;
        var widths = looks.Contains("p-b") ? Bold : Regular;
        var width = text.EnumerateRunes().Sum(rune => rune.Value - ' ' < widths.Length ? widths[rune.Value - ' '] : 700) * size / 1000.0;
        var (x, y) = (Number(element, "x"), Number(element, "y"));
        var left = looks.Contains("p-e") ? x - width : looks.Contains("p-c") ? x - (width / 2) : x;
        return new Box(text, left, y - (0.73 * size), left + width, y + (0.2 * size));
    }

    [StructLayout(LayoutKind.Auto)]
    internal readonly record struct Box(string What, double Left, double Top, double Right, double Bottom);
}
