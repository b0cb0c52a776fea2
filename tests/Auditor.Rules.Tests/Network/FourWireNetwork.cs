using System.Numerics;

namespace Auditor.Rules.Tests.Network;

/// <summary>
/// Lines and neutral of a whole tree with the currents of all final circuits, solved for the voltage lost on the way from a stiff
/// source. Each current keeps its angle to the source voltage of its line.
/// </summary>
internal sealed class FourWireNetwork
{
    private const int Neutral = 3;

    private readonly NodalNetwork _network = new();
    private readonly List<int[]> _boards = [];
    private readonly Dictionary<(int Board, int Circuit), int[]> _ends = [];

    public FourWireNetwork(FeederTree tree)
    {
        int[] origin = [NodalNetwork.Reference, NodalNetwork.Reference, NodalNetwork.Reference, NodalNetwork.Reference];
        foreach (var board in tree.Boards)
        {
            _boards.Add(board.Feeder is { } feeder ? Run(_boards[feeder], board.Lines, board.Feed, isRing: false) : origin);
        }

        foreach (var (board, number, circuit) in tree.Finals())
        {
            var end = Run(_boards[board], circuit.Lines, circuit.Cable, circuit.IsRing);
            _ends.Add((board, number), end);
            foreach (var line in circuit.Lines)
            {
                var current = circuit.Current * Source(line) * Complex.FromPolarCoordinates(1, -Math.Acos(circuit.PowerFactor));
                _network.Drive(end[line], end[Neutral], current);
            }
        }
    }

    /// <summary>Voltage lost between a line and the neutral on the way to a board, V; turned so that the source voltage is real.</summary>
    public Complex LostToBoard(int board, int line) => Lost(_boards[board], line);

    /// <summary>Voltage lost between a line and the neutral on the way to the end of a circuit, V; turned likewise.</summary>
    public Complex LostToEnd(int board, int circuit, int line) => Lost(_ends[(board, circuit)], line);

    private static Complex Source(int line) => Complex.FromPolarCoordinates(1, -2 * Math.PI / 3 * line);

    private Complex Lost(int[] nodes, int line) => _network.Between(nodes[line], nodes[Neutral]) / Source(line);

    private int[] Run(int[] from, IReadOnlyList<int> lines, Cable cable, bool isRing)
    {
        var end = new int[4];
        foreach (var conductor in lines.Append(Neutral))
        {
            var impedance = conductor == Neutral ? cable.NeutralHot : cable.LineHot;
            end[conductor] = _network.Node();
            for (var half = 0; half < (isRing ? 2 : 1); half++)
            {
                _network.Join(from[conductor], end[conductor], isRing ? impedance / 2 : impedance);
            }
        }

        return end;
    }
}
