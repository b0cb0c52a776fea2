namespace Auditor.Reports.Pictures.SingleLine;

/// <summary>Where things stand from left to right in a diagram.</summary>
/// <param name="depth">How deep boards stand below one another in it.</param>
internal sealed class Columns(int depth)
{
    public const double Trunk = 24;
    private const double FirstBus = 96;
    private const double Indent = 26;

    /// <summary>Where the load symbols begin.</summary>
    public double Load { get; } = 536 + (Indent * Math.Max(0, depth - 3));

    /// <summary>Where the marks stand.</summary>
    public double Badge => Load + 252;

    /// <summary>Room for the words beside a mark.</summary>
    public double BadgeRoom => Width - Badge - 18;

    /// <summary>Width of the diagram.</summary>
    public double Width => Load + 464;

    /// <summary>Room for the words beside a load.</summary>
    public double LoadRoom => Badge - Load - 40;

    /// <summary>The busbar of a board.</summary>
    public static double Bus(int boardDepth) => FirstBus + (Indent * boardDepth);

    /// <summary>Middle of the protective devices of a board.</summary>
    public static double Device(int boardDepth) => Bus(boardDepth) + 86;

    /// <summary>Middle of the residual current devices of a board.</summary>
    public static double Rcd(int boardDepth) => Bus(boardDepth) + 146;

    /// <summary>Where the cables of a board begin.</summary>
    public static double Cable(int boardDepth) => Bus(boardDepth) + 180;
}
