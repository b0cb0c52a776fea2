using System.Text;

namespace Auditor.Rules.Tests.Network;

/// <summary>Writes a feeder tree as a design file.</summary>
internal static class DesignText
{
    /// <summary>The design.</summary>
    /// <param name="tree">The tree.</param>
    /// <param name="withDiversity">Whether loads and feeders count by their diversity; otherwise in full.</param>
    public static string Of(FeederTree tree, bool withDiversity)
    {
        var text = new StringBuilder();
        text.Append($$"""
            design-format: 1
            basis: { supply-ownership: public, users: ordinary, ambient: 30 °C }
            supply:
              earthing: TN-S
              phases: {{tree.Phases}}
              voltage: {{(tree.Phases == 3 ? 400 : 230)}} V
              loop-impedance: { resistance: {{tree.EarthLoop.Real}} ohm, reactance: {{tree.EarthLoop.Imaginary}} ohm }
              fault-current: {{tree.FaultCurrent}} kA
            boards:

            """);
        for (var board = 0; board < tree.Boards.Count; board++)
        {
            Write(text, tree, board, withDiversity);
        }

        return text.ToString();
    }

    private static void Write(StringBuilder text, FeederTree tree, int number, bool withDiversity)
    {
        var board = tree.Boards[number];
        text.Append($"  - id: {FeederTree.Key(number)}\n");
        text.Append(board.Feeder is null ? "    fed-from: origin\n" : "");
        var fed = Enumerable.Range(0, tree.Boards.Count).Where(other => tree.Boards[other].Feeder == number).ToArray();
        text.Append(board.Circuits.Count + fed.Length == 0 ? "" : "    circuits:\n");
        for (var at = 0; at < board.Circuits.Count; at++)
        {
            var circuit = board.Circuits[at];
            Open(text, $"{at}", board.Lines, circuit.Lines);
            text.Append(circuit.IsRing ? "        arrangement: ring\n" : "");
            text.Append("        serves: [socket-outlets]\n");
            Run(text, circuit.Cable);
            text.Append($"        load: {{ current: {circuit.Current} A, power-factor: {circuit.PowerFactor}");
            text.Append(withDiversity ? $", diversity: {circuit.Diversity} }}\n" : " }\n");
        }

        foreach (var other in fed)
        {
            Open(text, $"to {FeederTree.Key(other)}", board.Lines, tree.Boards[other].Lines);
            text.Append($"        feeds: {FeederTree.Key(other)}\n");
            Run(text, tree.Boards[other].Feed);
            text.Append(withDiversity ? $"        load: {{ diversity: {tree.Boards[other].Diversity} }}\n" : "");
        }
    }

    private static void Open(StringBuilder text, string id, IReadOnlyList<int> available, IReadOnlyList<int> lines)
    {
        text.Append($"      - id: {id}\n");
        text.Append(available.Count == 1 ? "" : $"        phase: {string.Join('-', lines.Select(line => $"L{line + 1}"))}\n");
        text.Append("        device: { standard: EN 60898, curve: B, rating: 32 A, breaking-capacity: 10 kA }\n");
    }

    /// <summary>Runs of ten metres and more in two legs.</summary>
    private static void Run(StringBuilder text, Cable cable)
    {
        var first = Math.Floor(cable.Length * 0.4);
        var rest = Math.Round(cable.Length - first, 1);
        text.Append(first < 4
            ? $"        cable: {{ {Of(cable)}, length: {cable.Length} m }}\n"
            : $"        legs: [{{ {Of(cable)}, length: {first} m }}, {{ {Of(cable)}, length: {rest} m }}]\n");
    }

    private static string Of(Cable cable)
    {
        var parts = new List<string>
        {
            "construction: multicore, method: C, grouped-circuits: 1",
            $"insulation: {(cable.IsThermosetting ? "thermosetting 90" : "thermoplastic 70")}",
            $"csa: {cable.Csa} mm²",
            $"cpc: {cable.Cpc} mm²",
            $"cpc-kind: {(cable.HasOwnCpc ? "core" : "separate")}",
            $"parallel: {cable.Parallel}",
        };
        if (cable.Neutral is { } neutral)
        {
            parts.Add($"neutral-csa: {neutral} mm²");
        }

        if (cable.Stated is { } stated)
        {
            parts.Add($"resistance-per-metre: {stated.LineResistance} mohm/m");
            parts.Add($"cpc-resistance-per-metre: {stated.ProtectiveResistance} mohm/m");
            parts.Add($"reactance-per-metre: {stated.Reactance} mohm/m");
        }

        return string.Join(", ", parts);
    }
}
