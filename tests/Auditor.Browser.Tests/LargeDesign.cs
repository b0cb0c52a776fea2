using System.Text;

namespace Auditor.Browser.Tests;

/// <summary>A building with as many final circuits as asked for: a main switchboard and boards of thirty circuits.</summary>
internal static class LargeDesign
{
    private const int CircuitsPerBoard = 30;

    private const string Head = """
        design-format: 1
        project: { title: Large block, reference: LB-1, revision: A, designer: R. Example }
        rule-set: united-kingdom
        basis: { stage: design, supply-ownership: public, premises: office, ambient: 30 °C, test-temperature: 20 °C }
        supply: { earthing: TN-S, phases: 3, voltage: 400 V, frequency: 50 Hz, loop-impedance: "0.05 ohm, declared", fault-current: "9 kA, declared", agreed-capacity: 800 A }
        types:
          cables:
            flat-1.5: { construction: flat twin and earth, insulation: thermoplastic 70, csa: 1.5 mm², cpc: 1.0 mm² }
            flat-2.5: { construction: flat twin and earth, insulation: thermoplastic 70, csa: 2.5 mm², cpc: 1.5 mm² }
            armoured-50: { construction: armoured multicore, insulation: thermosetting 90, cores: 4, csa: 50 mm², cpc-kind: armour }
          devices:
            b6: { standard: EN 61009, curve: B, rating: 6 A, breaking-capacity: 10 kA, poles: 2, suitable-for-isolation: true }
            b16: { standard: EN 60898, curve: B, rating: 16 A, breaking-capacity: 10 kA, poles: 1, suitable-for-isolation: true }
            b20: { standard: EN 61009, curve: B, rating: 20 A, breaking-capacity: 10 kA, poles: 2, suitable-for-isolation: true }
            fuse-100: { standard: BS 88-2, rating: 100 A, breaking-capacity: 80 kA, poles: 3 }
        boards:
          - id: MSB
            name: Main switchboard
            fed-from: origin
            defaults: { method: C, grouped-circuits: 1 }
            circuits:

        """;

    /// <summary>The text of a design file.</summary>
    public static string Text(int circuits)
    {
        var boards = (circuits + CircuitsPerBoard - 1) / CircuitsPerBoard;
        var text = new StringBuilder(Head);
        for (var board = 1; board <= boards; board++)
        {
            text.Append($"      - {{ id: F{board}, name: Feeder {board}, feeds: DB{board}, phase: L1-L2-L3, device: {{ type: fuse-100 }}, ")
                .Append($"cable: {{ type: armoured-50, length: {10 + board} m }}, load: {{ power-factor: 0.95 }} }}\n");
        }

        for (var board = 1; board <= boards; board++)
        {
            text.Append($"  - id: DB{board}\n    name: Board {board}\n    defaults: {{ method: C, grouped-circuits: 1 }}\n    circuits:\n");
            for (var number = 1; number <= CircuitsPerBoard && ((board - 1) * CircuitsPerBoard) + number <= circuits; number++)
            {
                text.Append(Circuit(board, number));
            }
        }

        return text.ToString();
    }

    private static string Circuit(int board, int number)
    {
        var (name, device, cable, serves, current) = (number % 3) switch
        {
            0 => ("Lighting", "b6", "flat-1.5", "lighting", 0.8 + (0.02 * number)),
            1 => ("Sockets", "b20", "flat-2.5", "socket-outlets", 8 + (0.1 * number)),
            _ => ("Fan coils", "b16", "flat-2.5", "fixed-equipment", 9 + (0.1 * number)),
        };
        var rcd = number % 3 < 2 ? ", rcd: { type: A, residual-current: 30 mA }" : "";
        var standing = number % 15 == 0 ? ", assumed" : "";
        return $"      - {{ id: {number}, name: {name} {number}, phase: L{1 + (number % 3)}, device: {{ type: {device} }}, serves: [{serves}], "
            + $"cable: {{ type: {cable}, length: \"{8 + number + (board % 7)} m{standing}\" }}, load: {{ current: {current:0.00} A, power-factor: 0.95 }}{rcd} }}\n";
    }
}
