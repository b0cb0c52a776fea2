using Auditor.Rules.Tests.Network;
using CsCheck;
using MathNet.Numerics.LinearAlgebra;
using Complex = System.Numerics.Complex;

namespace Auditor.Rules.Tests;

/// <summary>
/// What the shipped sheets find on random feeder trees, branch by branch, against the solution of the whole network at once by its nodes.
/// </summary>
public class NetworkTests
{
    private const int Trees = 300;

    /// <summary>Relative difference that the order of arithmetic explains.</summary>
    private const double Same = 1e-9;

    /// <summary>
    /// The sheets multiply an impedance without regard to its angle by the sum of the most loaded line's current and the part of the
    /// neutral current in phase with it. The part across it is left out; with one line idle and the others alike it is greatest, and
    /// the whole is then 2/√3 of what the sheets count.
    /// </summary>
    private const double AcrossNeutral = 1.154701;

    /// <summary>Percent of 400 V between lines stand for percent of 230 V to neutral, while the root of three would give 230.94 V.</summary>
    private const double NominalPair = 1.004092;

    [Fact]
    public void Earth_fault_loops_are_those_of_the_whole_network() =>
        FeederTrees.Any.Sample(
            tree =>
            {
                var design = AuditedDesign.Read(DesignText.Of(tree, withDiversity: true));
                var loops = new LoopNetwork(tree, tree.EarthLoop, cable => cable.LineHot, cable => cable.Protective);
                for (var board = 0; board < tree.Boards.Count; board++)
                {
                    Agree(loops.AtBoard(board), design.Number(FeederTree.Key(board), "Zdb"));
                }

                foreach (var (board, number, _) in tree.Finals())
                {
                    var loop = loops.AtEnd(board, number);
                    Agree(loop, design.Number(FeederTree.Key(board, number), "Zs"));
                    Agree(0.95 * 230 / loop, design.Number(FeederTree.Key(board, number), "If"));
                }
            },
            iter: Trees, threads: 1);

    [Fact]
    public void Greatest_fault_currents_at_boards_are_those_of_the_whole_network() =>
        FeederTrees.Any.Sample(
            tree =>
            {
                var design = AuditedDesign.Read(DesignText.Of(tree, withDiversity: true));
                var source = new Complex(0, 1.1 * 230 / (tree.FaultCurrent * 1000));
                var loops = new LoopNetwork(tree, source, cable => cable.LineCold, cable => cable.NeutralCold);
                for (var board = 0; board < tree.Boards.Count; board++)
                {
                    var toNeutral = 1.1 * 230 / loops.AtBoard(board);
                    var allLines = 1.1 * 230 / loops.LineToBoard(board);
                    var isThreePhase = tree.Boards[board].Lines.Count == 3;
                    var found = design.Number(FeederTree.Key(board), "Ipf_db");
                    Agree(isThreePhase ? allLines : toNeutral, found);
                    Assert.True(found >= toNeutral * (1 - Same));
                }
            },
            iter: Trees, threads: 1);

    [Fact]
    public void Least_fault_currents_between_line_and_neutral_are_those_of_the_whole_network() =>
        FeederTrees.Any.Sample(
            tree =>
            {
                var design = AuditedDesign.Read(DesignText.Of(tree, withDiversity: true));
                var loops = new LoopNetwork(tree, tree.EarthLoop, cable => cable.LineHot, cable => cable.NeutralHot);
                foreach (var (board, number, _) in tree.Finals())
                {
                    Agree(0.95 * 230 / loops.AtEnd(board, number), design.Number(FeederTree.Key(board, number), "Isc_min"));
                }
            },
            iter: Trees, threads: 1);

    [Fact]
    public void Demand_is_what_all_boards_together_solve_for() =>
        FeederTrees.Any.Sample(
            tree =>
            {
                var design = AuditedDesign.Read(DesignText.Of(tree, withDiversity: true));
                var demand = Enumerable.Range(0, 3).Select(line => Demand(tree, line)).ToArray();
                for (var board = 0; board < tree.Boards.Count; board++)
                {
                    var lines = demand.Select(line => line[board]).ToArray();
                    var key = FeederTree.Key(board);
                    for (var line = 0; line < 3; line++)
                    {
                        Agree(lines[line], design.Number(key, $"I_L{line + 1}"));
                    }

                    Agree(lines.Max(), design.Number(key, "I_dem"));

                    // The root of a difference of squares: where the lines are alike, half the digits are lost.
                    var neutral = lines.Select((current, line) => Complex.FromPolarCoordinates(current, -2 * Math.PI / 3 * line)).Aggregate(Complex.Add);
                    Assert.InRange(design.Number(key, "I_N") - neutral.Magnitude, -1e-7 * lines.Sum(), 1e-7 * lines.Sum());
                }

                for (var line = 0; line < 3; line++)
                {
                    var atOrigin = tree.Boards.Select((board, at) => board.Feeder is null ? demand[line][at] : 0).Sum();
                    Agree(atOrigin, design.Number("-", $"I_L{line + 1}"));
                }
            },
            iter: Trees, threads: 1);

    [Fact]
    public void Voltage_drop_of_balanced_resistive_trees_is_that_of_the_whole_network() =>
        FeederTrees.Balanced.Sample(tree => DropsAgree(tree, toNeutral: 400 / Math.Sqrt(3)), iter: Trees, threads: 1);

    [Fact]
    public void Voltage_drop_of_single_phase_resistive_trees_is_that_of_the_whole_network() =>
        FeederTrees.SinglePhase.Sample(tree => DropsAgree(tree, toNeutral: 230), iter: Trees, threads: 1);

    /// <summary>Without reactance the part of the neutral current across that of the line drops no voltage along it, so nothing is left out.</summary>
    [Fact]
    public void The_drop_along_a_feeder_is_that_of_its_most_loaded_line_and_the_neutral() =>
        FeederTrees.UnbalancedResistive.Sample(
            tree =>
            {
                var design = AuditedDesign.Read(DesignText.Of(tree, withDiversity: false));
                var network = new FourWireNetwork(tree);
                for (var number = 0; number < tree.Boards.Count; number++)
                {
                    if (tree.Boards[number] is { Feeder: { } feeder } board)
                    {
                        var whole = board.Lines.Max(line => network.LostToBoard(number, line).Magnitude);
                        var most = board.Lines.Max(line => (network.LostToBoard(number, line) - network.LostToBoard(feeder, line)).Real);
                        Agree(most * (board.Lines.Count == 3 ? Math.Sqrt(3) : 1), design.Number(tree.FeederKey(number), "Vd"), whole);
                    }
                }
            },
            iter: Trees, threads: 1);

    [Fact]
    public void Voltage_drop_of_unbalanced_trees_is_not_above_what_the_sheets_count_by_more_than_the_neutral_across() =>
        FeederTrees.Unbalanced.Sample(
            tree =>
            {
                var design = AuditedDesign.Read(DesignText.Of(tree, withDiversity: false));
                var network = new FourWireNetwork(tree);
                foreach (var (board, number, circuit) in tree.Finals())
                {
                    var key = FeederTree.Key(board, number);
                    var upstream = design.Number(FeederTree.Key(board), "vd_db") * AcrossNeutral;
                    foreach (var line in circuit.Lines)
                    {
                        var whole = network.LostToEnd(board, number, line);
                        var own = (whole - network.LostToBoard(board, line)).Real;
                        var remains = (230 - whole).Magnitude;
                        Assert.True((230 - remains) / 230 <= ((upstream + design.Number(key, "vd")) * NominalPair) + Same);
                        if (circuit.Lines.Count == 1)
                        {
                            Agree(own, design.Number(key, "Vd"), whole.Magnitude);
                        }
                    }
                }
            },
            iter: Trees, threads: 1);

    private static void DropsAgree(FeederTree tree, double toNeutral)
    {
        var design = AuditedDesign.Read(DesignText.Of(tree, withDiversity: false));
        var network = new FourWireNetwork(tree);
        for (var board = 0; board < tree.Boards.Count; board++)
        {
            Agree(network.LostToBoard(board, 0).Real / toNeutral, design.Number(FeederTree.Key(board), "vd_db"));
        }

        foreach (var (board, number, circuit) in tree.Finals())
        {
            Agree(network.LostToEnd(board, number, circuit.Lines[0]).Real / toNeutral, design.Number(FeederTree.Key(board, number), "vd_total"));
        }
    }

    /// <summary>Demand on a line at each board: own circuits plus what each board fed from there counts for, solved for all boards at once.</summary>
    private static Vector<double> Demand(FeederTree tree, int line)
    {
        var counts = Matrix<double>.Build.DenseIdentity(tree.Boards.Count);
        var own = Vector<double>.Build.Dense(tree.Boards.Count);
        for (var board = 0; board < tree.Boards.Count; board++)
        {
            if (tree.Boards[board].Feeder is { } feeder)
            {
                counts[feeder, board] -= tree.Boards[board].Diversity;
            }

            own[board] = tree.Boards[board].Circuits.Where(circuit => circuit.Lines.Contains(line)).Sum(circuit => circuit.Current * circuit.Diversity);
        }

        return counts.Solve(own);
    }

    /// <summary>Fails unless two figures agree.</summary>
    /// <param name="expected">The figure of the whole network.</param>
    /// <param name="actual">The figure of the sheets.</param>
    /// <param name="takenFrom">Size of the figures of which the expected one is the difference, and so takes over the last digits.</param>
    private static void Agree(double expected, double actual, double takenFrom = 0)
    {
        var slack = (Same * Math.Abs(expected)) + (1e-12 * takenFrom);
        Assert.InRange(actual - expected, -slack, slack);
    }
}
