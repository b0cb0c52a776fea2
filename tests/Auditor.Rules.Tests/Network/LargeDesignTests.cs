using System.Numerics;

namespace Auditor.Rules.Tests.Network;

/// <summary>A design as large and as deep as big buildings have them: six hundred final circuits, a submain through five boards.</summary>
public class LargeDesignTests
{
    private const int Depth = 5;
    private const int CircuitsPerBoard = 100;

    private static readonly FeederTree Tree = new(3, new Complex(0.05, 0.02), 16, [.. Enumerable.Range(0, Depth + 1).Select(Level)]);

    private static readonly AuditedDesign Design = AuditedDesign.Read(DesignText.Of(Tree, withDiversity: true));

    [Fact]
    public void It_audits_and_every_circuit_has_its_findings()
    {
        var judged = Design.Audit().Findings.Select(finding => finding.Subject.Key).ToHashSet();
        Assert.Equal((Depth + 1) * CircuitsPerBoard, Tree.Finals().Count());
        Assert.All(Tree.Finals(), final => Assert.Contains(FeederTree.Key(final.Board, final.Number), judged));
    }

    [Theory]
    [InlineData("Zs", 0.05, 10)]
    [InlineData("If", 20, 16_000)]
    [InlineData("Isc_min", 20, 16_000)]
    [InlineData("Ipf_max", 100, 17_600)]
    [InlineData("Iz", 10, 100)]
    [InlineData("vd_total", 1e-4, 1)]
    [InlineData("R1R2", 0.001, 3)]
    [InlineData("Zs_max", 1, 10)]
    public void The_figures_of_every_circuit_are_there_and_within_reason(string symbol, double least, double most) =>
        Assert.All(Tree.Finals(), final => Assert.InRange(Design.Number(FeederTree.Key(final.Board, final.Number), symbol), least, most));

    [Fact]
    public void Loops_and_drops_rise_and_fault_currents_fall_from_board_to_board()
    {
        for (var board = 1; board <= Depth; board++)
        {
            var (here, before) = (FeederTree.Key(board), FeederTree.Key(board - 1));
            Assert.True(Design.Number(here, "Zdb") > Design.Number(before, "Zdb"));
            Assert.True(Design.Number(here, "vd_db") > Design.Number(before, "vd_db"));
            Assert.True(Design.Number(here, "Ipf_db") < Design.Number(before, "Ipf_db"));
            Assert.True(Design.Number(here, "I_dem") < Design.Number(before, "I_dem"));
        }

        Assert.All(Tree.Finals(), final =>
            Assert.True(Design.Number(FeederTree.Key(final.Board, final.Number), "Zs") > Design.Number(FeederTree.Key(final.Board), "Zdb")));
    }

    private static Board Level(int level)
    {
        var feed = new Cable(16, Neutral: null, 16, new PerMetre(0.1, 0.2, 0.08), 1, 12 + level, HasOwnCpc: true, IsThermosetting: true);
        return new Board(level == 0 ? null : level - 1, [0, 1, 2], feed, 0.5, [.. Enumerable.Range(0, CircuitsPerBoard).Select(Circuit)]);
    }

    private static FinalCircuit Circuit(int number)
    {
        var cable = new Cable(2.5, Neutral: null, 1.5, Stated: null, Parallel: 1, 10 + (number / 4.0), HasOwnCpc: true, IsThermosetting: false);
        return new FinalCircuit(number % 10 == 0 ? [0, 1, 2] : [number % 3], cable, IsRing: number % 7 == 1, 1 + (number / 50.0), 0.9, 0.4);
    }
}
