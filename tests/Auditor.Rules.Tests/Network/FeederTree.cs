using System.Numerics;

namespace Auditor.Rules.Tests.Network;

/// <summary>A random installation in a TN-S system: boards fed by boards, each after the one that feeds it.</summary>
/// <param name="Phases">Line conductors of the supply, 1 (230 V) or 3 (230/400 V).</param>
/// <param name="EarthLoop">External earth fault loop impedance, Ω.</param>
/// <param name="FaultCurrent">Greatest prospective fault current at the origin, kA.</param>
/// <param name="Boards">The boards.</param>
internal sealed record FeederTree(int Phases, Complex EarthLoop, double FaultCurrent, IReadOnlyList<Board> Boards)
{
    /// <summary>Key of a board in the design.</summary>
    public static string Key(int board) => $"B{board}";

    /// <summary>Key of a final circuit in the design.</summary>
    public static string Key(int board, int circuit) => $"B{board}/{circuit}";

    /// <summary>Key of the circuit that feeds a board; only of one that is not at the origin.</summary>
    public string FeederKey(int board) => $"B{Boards[board].Feeder}/to B{board}";

    /// <summary>Every final circuit with the number of its board and its own number there.</summary>
    public IEnumerable<(int Board, int Number, FinalCircuit Circuit)> Finals() =>
        Boards.SelectMany((board, at) => board.Circuits.Select((circuit, number) => (at, number, circuit)));
}
