using System.Numerics;
using CsCheck;

namespace Auditor.Rules.Tests.Network;

/// <summary>Random feeder trees: up to five levels of one to four boards, each on any board of the level above.</summary>
internal static class FeederTrees
{
    private static readonly int[] AllLines = [0, 1, 2];

    private static readonly Gen<double> Share = Gen.Int[20, 100].Select(percent => percent / 100.0);

    private static readonly Gen<PerMetre> Maker =
        Gen.Select(Gen.Int[50, 9000], Gen.Int[50, 19_000], Gen.Int[0, 250], (line, protective, reactance) => new PerMetre(line / 1e3, protective / 1e3, reactance / 1e3));

    private static readonly Gen<double> Size = Gen.OneOf(Cable.Sizes.ToArray());

    private static readonly Gen<double?> LikeTheLines = Gen.Const((double?)null);

    private static readonly Gen<double?> OfAnySize = Gen.Frequency((2, LikeTheLines), (1, Size.Select(size => (double?)size)));

    private static readonly Gen<PerMetre?> Reactive = Maker.Select(maker => (PerMetre?)maker);

    private static readonly Gen<PerMetre?> Resistive = Maker.Select(maker => (PerMetre?)(maker with { Reactance = 0 }));

    /// <summary>Any cables, lines and power factors, circuits between two lines among them.</summary>
    public static Gen<FeederTree> Any { get; } = Trees(3, Gen.Frequency((1, Gen.Const((PerMetre?)null)), (2, Reactive)), OfAnySize, Share, LinesOf);

    /// <summary>Three-phase circuits with equal resistive loads on each line, on cables without reactance.</summary>
    public static Gen<FeederTree> Balanced { get; } = Trees(3, Resistive, OfAnySize, Gen.Const(1.0), (_, _) => AllLines);

    /// <summary>A single-phase supply with resistive loads on cables without reactance.</summary>
    public static Gen<FeederTree> SinglePhase { get; } = Trees(1, Resistive, OfAnySize, Gen.Const(1.0), (_, _) => [0]);

    /// <summary>Unbalanced three-phase trees with resistive loads on cables without reactance.</summary>
    public static Gen<FeederTree> UnbalancedResistive { get; } = Trees(3, Resistive, OfAnySize, Gen.Const(1.0), OneOrThree);

    /// <summary>Unbalanced three-phase trees on cables with reactance and a full neutral; all loads of a tree have one power factor.</summary>
    public static Gen<FeederTree> Unbalanced { get; } = Share.SelectMany(cosine => Trees(3, Reactive, LikeTheLines, Gen.Const(cosine), OneOrThree));

    private static Gen<FeederTree> Trees(
        int phases, Gen<PerMetre?> stated, Gen<double?> neutral, Gen<double> cosine, Func<int, IReadOnlyList<int>, IReadOnlyList<int>> lines)
    {
        var cable =
            from sizes in Gen.Select(Size, neutral, Size)
            from maker in stated
            from parallel in Gen.Frequency((3, Gen.Const(1)), (1, Gen.Int[2, 3]))
            from length in Gen.Int[1, 900]
            from kind in Gen.Select(Gen.Bool, Gen.Bool)
            select new Cable(sizes.Item1, sizes.Item2, sizes.Item3, maker, parallel, length / 10.0, kind.Item1, kind.Item2);
        var load =
            from pick in Gen.Int[0, 9]
            from run in cable
            from isRing in Gen.Frequency((3, Gen.Const(false)), (1, Gen.Const(true)))
            from current in Gen.Int[1, 400]
            from powerFactor in cosine
            from diversity in Share
            select new Load(pick, run, isRing, current / 10.0, powerFactor, diversity);
        var station =
            from feeder in Gen.Int[0, 11]
            from pick in Gen.Int[0, 8]
            from run in cable
            from diversity in Share
            from loads in load.Array[0, 4]
            select new Station(feeder, pick, run, diversity, loads);
        return
            from levels in station.Array[1, 4].Array[1, 5]
            from loop in Gen.Select(Gen.Int[5, 800], Gen.Int[0, 200], (r, x) => new Complex(r / 1e3, x / 1e3))
            from fault in Gen.Int[10, 250]
            select new FeederTree(phases, loop, fault / 10.0, Boards(levels, phases == 3 ? AllLines : [0], lines));
    }

    private static List<Board> Boards(Station[][] levels, IReadOnlyList<int> supply, Func<int, IReadOnlyList<int>, IReadOnlyList<int>> lines)
    {
        var boards = new List<Board>();
        var above = 0..0;
        foreach (var level in levels)
        {
            var first = boards.Count;
            foreach (var station in level)
            {
                int? feeder = first == 0 ? null : above.Start.Value + (station.Feeder % (above.End.Value - above.Start.Value));
                var own = feeder is { } by ? lines(station.Pick, boards[by].Lines) : supply;
                boards.Add(new Board(feeder, own, station.Feed, station.Diversity, [.. station.Loads.Select(load => load.On(lines(load.Pick, own)))]));
            }

            above = first..boards.Count;
        }

        return boards;
    }

    private static IReadOnlyList<int> LinesOf(int pick, IReadOnlyList<int> available) => available.Count == 1 ? available : pick switch
    {
        < 2 => [0],
        < 4 => [1],
        < 6 => [2],
        < 9 => AllLines,
        _ => [1, 2],
    };

    private static IReadOnlyList<int> OneOrThree(int pick, IReadOnlyList<int> available) => LinesOf(pick % 9, available);

    private sealed record Load(int Pick, Cable Cable, bool IsRing, double Current, double PowerFactor, double Diversity)
    {
        public FinalCircuit On(IReadOnlyList<int> lines) =>
            new(lines, IsRing ? Cable with { Parallel = 1 } : Cable, IsRing, Current, PowerFactor, Diversity);
    }

    private sealed record Station(int Feeder, int Pick, Cable Feed, double Diversity, Load[] Loads);
}
