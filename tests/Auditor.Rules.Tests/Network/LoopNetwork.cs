using System.Numerics;

namespace Auditor.Rules.Tests.Network;

/// <summary>
/// One line conductor and the conductor by which a fault returns, through a whole tree. The source stands at the reference node,
/// which is also where the return conductor starts. A ring is two halves side by side that meet at its mid-point.
/// </summary>
internal sealed class LoopNetwork
{
    private readonly NodalNetwork _network = new();
    private readonly List<(int Line, int Return)> _boards = [];
    private readonly Dictionary<(int Board, int Circuit), (int Line, int Return)> _ends = [];

    public LoopNetwork(FeederTree tree, Complex source, Func<Cable, Complex> line, Func<Cable, Complex> back)
    {
        var origin = (Line: _network.Node(), Return: NodalNetwork.Reference);
        _network.Join(NodalNetwork.Reference, origin.Line, source);
        foreach (var board in tree.Boards)
        {
            _boards.Add(board.Feeder is { } feeder ? Run(_boards[feeder], line(board.Feed), back(board.Feed), isRing: false) : origin);
        }

        foreach (var (board, number, circuit) in tree.Finals())
        {
            _ends.Add((board, number), Run(_boards[board], line(circuit.Cable), back(circuit.Cable), circuit.IsRing));
        }
    }

    /// <summary>Impedance of the loop at a board, Ω.</summary>
    public double AtBoard(int board) => _network.Seen(_boards[board].Line, _boards[board].Return);

    /// <summary>Impedance from the source to a board by the line conductor alone, Ω.</summary>
    public double LineToBoard(int board) => _network.Seen(_boards[board].Line, NodalNetwork.Reference);

    /// <summary>Impedance of the loop at the end of a final circuit, Ω.</summary>
    public double AtEnd(int board, int circuit) => _network.Seen(_ends[(board, circuit)].Line, _ends[(board, circuit)].Return);

    private (int Line, int Return) Run((int Line, int Return) from, Complex line, Complex back, bool isRing)
    {
        var end = (Line: _network.Node(), Return: _network.Node());
        for (var half = 0; half < (isRing ? 2 : 1); half++)
        {
            _network.Join(from.Line, end.Line, isRing ? line / 2 : line);
            _network.Join(from.Return, end.Return, isRing ? back / 2 : back);
        }

        return end;
    }
}
