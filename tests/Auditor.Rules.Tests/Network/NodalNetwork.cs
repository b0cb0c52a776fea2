using MathNet.Numerics.LinearAlgebra;
using Complex = System.Numerics.Complex;

namespace Auditor.Rules.Tests.Network;

/// <summary>A linear network solved by its nodes: a dense complex admittance matrix over all of them at once.</summary>
internal sealed class NodalNetwork
{
    /// <summary>The node that all voltages are counted from.</summary>
    public const int Reference = 0;

    private readonly List<(int From, int To, Complex Impedance)> _branches = [];
    private readonly List<(int Node, Complex Current)> _injections = [];
    private int _nodes = 1;
    private Matrix<Complex>? _inverse;
    private Vector<Complex>? _voltages;

    /// <summary>A further node.</summary>
    public int Node() => _nodes++;

    /// <summary>Joins two nodes by an impedance, Ω.</summary>
    public void Join(int from, int to, Complex impedance) => _branches.Add((from, to, impedance));

    /// <summary>Drives a current into one node and out of another, A.</summary>
    public void Drive(int into, int outOf, Complex current)
    {
        _injections.Add((into, current));
        _injections.Add((outOf, -current));
    }

    /// <summary>The impedance seen between two nodes, Ω.</summary>
    public double Seen(int from, int to) => (Inverse(from, from) - Inverse(from, to) - Inverse(to, from) + Inverse(to, to)).Magnitude;

    /// <summary>The voltage between two nodes with all currents driven, V.</summary>
    public Complex Between(int from, int to)
    {
        _voltages ??= Solve();
        return At(from) - At(to);
    }

    private Complex At(int node) => node == Reference ? Complex.Zero : _voltages![node - 1];

    private Complex Inverse(int row, int column)
    {
        _inverse ??= Admittances().Inverse();
        return row == Reference || column == Reference ? Complex.Zero : _inverse[row - 1, column - 1];
    }

    private Vector<Complex> Solve()
    {
        var currents = Vector<Complex>.Build.Dense(_nodes);
        foreach (var (node, current) in _injections)
        {
            currents[node] += current;
        }

        return Admittances().Solve(currents.SubVector(1, _nodes - 1));
    }

    private Matrix<Complex> Admittances()
    {
        var whole = Matrix<Complex>.Build.Dense(_nodes, _nodes);
        foreach (var (from, to, impedance) in _branches)
        {
            var admittance = Complex.One / impedance;
            whole[from, from] += admittance;
            whole[to, to] += admittance;
            whole[from, to] -= admittance;
            whole[to, from] -= admittance;
        }

        return whole.SubMatrix(1, _nodes - 1, 1, _nodes - 1);
    }
}
