using Auditor.Reports.Pictures.Drawing;

namespace Auditor.Reports.Pictures.SingleLine;

/// <summary>
/// Graphical symbols after IEC 60617, from memory of the standard, in a geometry of our own: circuit-breaker (a cross at the fixed
/// contact), switch-disconnector (a bar and a circle there), fuse, residual current device (a ring for the current transformer, linked to the
/// mechanism), transformer, earth, socket-outlet with protective contact, lamp, motor, heater, generator, and an arrow for any other
/// load. Devices lie on a line from left to right about the origin, 30 wide; loads begin at the origin.
/// </summary>
internal static class Symbols
{
    private const string Blade = "M8 0L-6 -9M8 0H15M-15 0H-7";

    private static readonly Dictionary<string, Action<Canvas>> Drawn = new()
    {
        ["circuit-breaker"] = canvas => canvas.Path(Blade + "M-10 -3L-4 3M-10 3L-4 -3", "line"),
        ["switch"] = canvas =>
        {
            canvas.Path(Blade + "M-9 -5V5", "line");
            canvas.Circle(-6.6, 0, 2, "line fill");
        },
        ["fuse"] = canvas =>
        {
            canvas.Rect(-11, -5, 22, 10, "line fill");
            canvas.Path("M-15 0H15", "line");
        },
        ["rcd"] = canvas => canvas.Path("M-4 0a4 8 0 1 0 8 0a4 8 0 1 0 -8 0M-4 0H4", "line"),
        ["transformer"] = canvas => canvas.Path("M-8 -5a8 8 0 1 0 16 0a8 8 0 1 0 -16 0M-8 5a8 8 0 1 0 16 0a8 8 0 1 0 -16 0", "line"),
        ["incoming"] = canvas => canvas.Path("M0 8L-4 -2H4Z", "solid"),
        ["earth"] = canvas => canvas.Path("M0 0V5M-9 5H9M-6 9H6M-3 13H3", "line"),
        ["load"] = canvas =>
        {
            canvas.Path("M0 0H8", "line");
            canvas.Path("M8 -4L18 0L8 4Z", "solid");
        },
        ["socket-outlet"] = canvas => canvas.Path("M0 0H8M8 -8V8M17 -8A8 8 0 0 0 17 8", "line"),
        ["luminaire"] = canvas => canvas.Path("M0 0H3M3 0a7 7 0 1 0 14 0a7 7 0 1 0 -14 0M5 -5L15 5M15 -5L5 5", "line"),
        ["motor"] = canvas => Machine(canvas, "M"),
        ["generator"] = canvas => Machine(canvas, "G"),
        ["heater"] = canvas => canvas.Path("M0 0H2M2 -5H20V5H2ZM6.5 -5V5M11 -5V5M15.5 -5V5", "line"),
    };

    /// <summary>Defines the named symbols.</summary>
    public static void Define(Canvas canvas, IEnumerable<string> names)
    {
        foreach (var name in names)
        {
            using (canvas.Define(name))
            {
                Drawn[name](canvas);
            }
        }
    }

    private static void Machine(Canvas canvas, string letter)
    {
        canvas.Path("M0 0H2M2 0a8 8 0 1 0 16 0a8 8 0 1 0 -16 0", "line");
        canvas.Text(10, 3.8, letter, "s b c");
    }
}
