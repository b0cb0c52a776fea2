namespace Auditor.Hostile.Tests.Cases;

/// <summary>A design without fault, to which a case adds one.</summary>
internal static class Site
{
    /// <summary>All that a design has to say before its boards.</summary>
    public const string Head = """
        design-format: 1
        supply: { earthing: TN-S, phases: 1, voltage: 230 V, loop-impedance: 0.3 ohm, fault-current: 1.6 kA }

        """;

    /// <summary>A board with one circuit.</summary>
    public const string Board = """
        id: A
            circuits:
              - { id: 1, name: Lamps, device: { standard: EN 60898, curve: B, rating: 6 A }, cable: { construction: single-core, csa: 1.5 mm², length: 10 m }, load: { current: 4 A } }

        """;

    /// <summary>The whole.</summary>
    public const string Good = Head + "boards:\n  - " + Board;

    /// <summary>The same text many times.</summary>
    public static string Times(int count, string text) => string.Concat(Enumerable.Repeat(text, count));

    /// <summary>Lines made of their numbers.</summary>
    public static string Lines(int count, Func<int, string> line) => string.Concat(Enumerable.Range(0, count).Select(number => line(number) + "\n"));
}
