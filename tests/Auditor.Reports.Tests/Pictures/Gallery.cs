using System.Collections.Concurrent;
using System.Globalization;
using System.Text;
using System.Xml.Linq;
using Auditor.Engine.Findings;
using Auditor.Reports.Pictures;

namespace Auditor.Reports.Tests.Pictures;

/// <summary>The pictures that the tests look at.</summary>
internal static class Gallery
{
    private static readonly ConcurrentDictionary<string, Lazy<Shown>> Drawn = [];

    /// <summary>The examples, and a design of many boards and circuits.</summary>
    public static TheoryData<string> Designs => [.. ExampleAudit.All, Large];

    /// <summary>Name of the design of 20 boards and 600 circuits.</summary>
    public const string Large = "large.design.yaml";

    /// <summary>An audit and its pictures; each design is drawn once.</summary>
    public static Shown Of(string design) => Drawn.GetOrAdd(design, key => new Lazy<Shown>(() => Draw(key))).Value;

    /// <summary>The audit of a design that a test writes.</summary>
    public static Shown OfText(string text)
    {
        using var folder = new TemporaryFolder();
        var audit = ExampleAudit.At(folder.Write("own.design.yaml", text), "own.design.yaml", ExampleAudit.Rules);
        return new Shown(audit, PictureBuilder.Of(audit));
    }

    /// <summary>A picture as XML.</summary>
    public static XElement Xml(Picture picture) => XDocument.Parse(picture.Svg).Root!;

    private static Shown Draw(string design)
    {
        if (design == Large)
        {
            return OfText(LargeDesign());
        }

        var audit = ExampleAudit.Of(design);
        return new Shown(audit, PictureBuilder.Of(audit));
    }

    private static string LargeDesign()
    {
        var text = new StringBuilder(
            """
            design-format: 1
            project: { title: Long row of units, reference: LR-1, revision: A, designer: R. Example }
            rule-set: united-kingdom
            basis: { stage: design, supply-ownership: public, premises: office, ambient: 30 °C }
            supply: { earthing: TN-S, phases: 3, voltage: 400 V, loop-impedance: 0.05 ohm, fault-current: 9 kA, agreed-capacity: 800 A }
            boards:
              - id: MSB
                name: Main switchboard
                circuits:

            """);
        var boards = new StringBuilder();
        for (var board = 1; board <= 20; board++)
        {
            text.Append(CultureInfo.InvariantCulture, $"""
                  - id: F{board}
                    device: {"{"} standard: BS 88-2, rating: 100 A {"}"}
                    phase: L1-L2-L3
                    cable: {"{"} construction: armoured multicore, insulation: thermosetting 90, csa: 50 mm², cpc-kind: armour, length: {10 + board} m, method: C {"}"}
                    feeds: DB{board}

            """);
            boards.Append(CultureInfo.InvariantCulture, $"  - id: DB{board}\n    name: Unit {board}\n    circuits:\n");
            for (var circuit = 1; circuit <= 29; circuit++)
            {
                boards.Append(CultureInfo.InvariantCulture, $"""
                      - id: {circuit}
                        name: Sockets {circuit}
                        device: {"{"} standard: EN 60898, curve: B, rating: 20 A {"}"}
                        phase: L{(circuit % 3) + 1}
                        cable: {"{"} construction: flat twin and earth, insulation: thermoplastic 70, csa: 2.5 mm², cpc: 1.5 mm², length: {12 + circuit} m, method: C {"}"}
                        serves: [socket-outlets]
                        load: {"{"} current: 9 A {"}"}

                """);
            }
        }

        return text.Append(boards).ToString();
    }

    /// <summary>An audit and its pictures.</summary>
    internal sealed record Shown(AuditResult Audit, IReadOnlyList<Picture> Pictures)
    {
        /// <summary>The pictures of a kind.</summary>
        public IEnumerable<Picture> Of(string kind) => Pictures.Where(picture => picture.Kind == kind);
    }
}
