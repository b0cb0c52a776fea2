namespace Auditor.Reports.Pictures.Drawing;

/// <summary>
/// The marks for the state of a finding. Each has a shape of its own, so that none rests on colour: a filled square with a cross, a hollow one
/// for recommendations, a broken ring with a tick, a diamond with a question mark, a triangle, a disc with a tick.
/// </summary>
internal static class Badges
{
    /// <summary>The mark of what is kept as stated, but not everywhere within the tolerances.</summary>
    public const string Unproven = "unproven";

    /// <summary>Names of the marks with the words for them, the gravest first.</summary>
    public static readonly (string Mark, string Words)[] All =
    [
        ("nonconforming", "requirement not met"), (Unproven, "unproven within tolerances"), ("undetermined", "open: input missing"), ("advised", "recommendation not met"),
        ("departed", "departed from"), ("conforms", "conforms"),
    ];

    /// <summary>Defines some marks, centred on the origin and 14 wide.</summary>
    public static void Define(Canvas canvas, IEnumerable<string> marks)
    {
        foreach (var mark in marks)
        {
            using (canvas.Define(mark))
            {
                Draw(canvas, mark);
            }
        }
    }

    /// <summary>Draws what the marks mean in one line; how far it reaches to the right is returned.</summary>
    public static double Legend(Canvas canvas, IEnumerable<string> marks, double x, double y)
    {
        foreach (var (mark, words) in All.Where(entry => marks.Contains(entry.Mark)))
        {
            canvas.Use(mark, x + 7, y);
            canvas.Text(x + 18, y + 4, words, "s");
            x += 34 + Canvas.WidthOf(words, "s");
        }

        return x;
    }

    private static void Draw(Canvas canvas, string mark)
    {
        switch (mark)
        {
            case "nonconforming":
                canvas.Rect(-7, -7, 14, 14, "nonconforming solid", 1);
                canvas.Path("M-3.5 -3.5L3.5 3.5M3.5 -3.5L-3.5 3.5", "cut");
                break;
            case "advised":
                canvas.Rect(-6, -6, 12, 12, "nonconforming hollow", 1);
                canvas.Path("M-3 -3L3 3M3 -3L-3 3", "nonconforming stroke");
                break;
            case "undetermined":
                canvas.Path("M0 -8L8 0L0 8L-8 0Z", "undetermined hollow");
                canvas.Text(0, 3.6, "?", "undetermined s b c");
                break;
            case Unproven:
                canvas.Circle(0, 0, 6.5, "unproven hollow close");
                canvas.Path("M-3 0.3L-0.8 2.6L3.2 -2.4", "unproven stroke");
                break;
            case "departed":
                canvas.Path("M0 -7L7.5 6H-7.5Z", "departed hollow");
                canvas.Path("M0 -2V2M0 3.6V4.4", "departed stroke");
                break;
            default:
                canvas.Circle(0, 0, 6.5, "conforms solid");
                canvas.Path("M-3 0.3L-0.8 2.6L3.2 -2.4", "cut");
                break;
        }
    }
}
