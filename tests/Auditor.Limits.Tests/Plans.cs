using CsCheck;

namespace Auditor.Limits.Tests;

/// <summary>Random designs: an origin, a main board with final circuits and a feeder, and a sub-board with final circuits.</summary>
internal static class Plans
{
    private static readonly string[] SmallSizes = ["1 mm²", "1.5 mm²", "2.5 mm²", "4 mm²", "6 mm²", "10 mm²"];
    private static readonly string[] LargeSizes = ["16 mm²", "25 mm²", "35 mm²", "50 mm²", "70 mm²", "95 mm²"];
    private static readonly string[] Ratings = ["6 A", "10 A", "16 A", "20 A", "25 A", "32 A", "40 A"];

    /// <summary>Any design.</summary>
    public static Gen<Plan> Any { get; } = WithTolerance(Gen.Const(""));

    /// <summary>Any design, every quantity of it that people measure or pace out with a tolerance.</summary>
    public static Gen<Plan> Toleranced { get; } = WithTolerance(Gen.OneOf("", " ± 10 %", " ± 5 %", " ± 20 %"));

    /// <summary>A three-phase main board with a ring and a radial, and a sub-board with one radial.</summary>
    public static Plan Fixed { get; } = Join(
        new()
        {
            ["project.title"] = "Plan",
            ["basis.stage"] = "verification",
            ["basis.supply-ownership"] = "public",
            ["basis.premises"] = "workshop",
            ["basis.ambient"] = "30 °C",
            ["basis.test-temperature"] = "10 °C",
            ["supply.earthing"] = "TN-S",
            ["supply.phases"] = "3",
            ["supply.voltage"] = "400 V",
            ["supply.loop-impedance"] = "0.3 ohm",
            ["supply.fault-current"] = "3 kA",
            ["supply.agreed-capacity"] = "100 A",
        },
        new()
        {
            ["device.standard"] = "BS 88-2",
            ["device.rating"] = "63 A",
            ["device.breaking-capacity"] = "80 kA",
            ["load.power-factor"] = "0.9",
            ["leg.construction"] = "armoured multicore",
            ["leg.insulation"] = "thermosetting 90",
            ["leg.cores"] = "4",
            ["leg.csa"] = "25 mm²",
            ["leg.cpc-kind"] = "armour",
            ["leg.length"] = "40 m",
            ["leg.method"] = "C",
        },
        [
            Final("2.5 mm²", "30 m", 30, 1, "32 A", "B", "20 A", "0.5 ohm", (true, true, false)),
            Final("2.5 mm²", "20 m", 30, 1, "20 A", "B", "12 A", "0.5 ohm", (false, false, true)),
        ],
        [Final("4 mm²", "25 m", 30, 2, "25 A", "C", "18 A", "0.9 ohm", (false, false, true))]);

    /// <summary>One circuit on one board.</summary>
    public static Plan Single(double ze, Dictionary<string, string> circuit) => new(
        new Dictionary<(string, string), string>
        {
            [("-", "project.title")] = "Plan",
            [("-", "basis.stage")] = "design",
            [("-", "basis.supply-ownership")] = "public",
            [("-", "basis.premises")] = "dwelling",
            [("-", "basis.ambient")] = "30 °C",
            [("-", "basis.test-temperature")] = "20 °C",
            [("-", "supply.earthing")] = "TN-S",
            [("-", "supply.phases")] = "1",
            [("-", "supply.voltage")] = "230 V",
            [("-", "supply.loop-impedance")] = $"{ze} ohm",
            [("-", "supply.fault-current")] = "1 kA",
        }.Concat(circuit.Select(entry => KeyValuePair.Create(
            entry.Key.StartsWith("leg.", StringComparison.Ordinal) ? ("B/1/leg 1", entry.Key[4..]) : ("B/1", entry.Key), entry.Value))).ToDictionary(),
        [("B", [("1", 1)])]);

    private static Gen<Plan> WithTolerance(Gen<string> tolerance) =>
        from final in Final(tolerance).List[1, 3]
        from below in Final(tolerance).List[1, 3]
        from feeder in Feeder(tolerance)
        from origin in Origin(tolerance)
        select Join(origin, feeder, final, below);

    private static Gen<Dictionary<string, string>> Origin(Gen<string> tolerance) =>
        from ze in Gen.Double[0.05, 0.8]
        from off in tolerance
        from fault in Gen.Double[1, 9]
        from earthing in Gen.OneOf("TN-S", "TN-C-S")
        from phases in Gen.Bool
        select new Dictionary<string, string>
        {
            ["project.title"] = "Plan",
            ["basis.stage"] = "verification",
            ["basis.supply-ownership"] = "public",
            ["basis.premises"] = "workshop",
            ["basis.ambient"] = "30 °C",
            ["basis.test-temperature"] = "15 °C",
            ["supply.earthing"] = earthing,
            ["supply.phases"] = phases ? "3" : "1",
            ["supply.voltage"] = phases ? "400 V" : "230 V",
            ["supply.loop-impedance"] = $"{ze:0.000} ohm{off}",
            ["supply.fault-current"] = $"{fault:0.00} kA",
            ["supply.agreed-capacity"] = "100 A",
        };

    private static Gen<Dictionary<string, string>> Feeder(Gen<string> tolerance) =>
        from size in Gen.OneOf(LargeSizes)
        from length in Gen.Double[5, 90]
        from off in tolerance
        from rating in Gen.OneOf("50 A", "63 A", "80 A", "100 A")
        select new Dictionary<string, string>
        {
            ["device.standard"] = "BS 88-2",
            ["device.rating"] = rating,
            ["device.breaking-capacity"] = "80 kA",
            ["load.power-factor"] = $"0.9{off}",
            ["leg.construction"] = "armoured multicore",
            ["leg.insulation"] = "thermosetting 90",
            ["leg.cores"] = "4",
            ["leg.csa"] = size,
            ["leg.cpc-kind"] = "armour",
            ["leg.length"] = $"{length:0.0} m{off}",
            ["leg.method"] = "C",
        };

    private static Gen<Dictionary<string, string>> Final(Gen<string> tolerance) =>
        from size in Gen.OneOf(SmallSizes)
        from length in Gen.Double[2, 60]
        from offLength in tolerance
        from ambient in Gen.Int[20, 45]
        from grouped in Gen.Int[1, 6]
        from rating in Gen.OneOf(Ratings)
        from curve in Gen.OneOf("B", "C", "D")
        from current in Gen.Double[1, 38]
        from offCurrent in tolerance
        from reading in Gen.Double[0.2, 3]
        from switches in Gen.Select(Gen.Bool, Gen.Bool, Gen.Bool)
        select Final(size, $"{length:0.0} m{offLength}", ambient, grouped, rating, curve, $"{current:0.0} A{offCurrent}", $"{reading:0.00} ohm", switches);

    private static Dictionary<string, string> Final(
        string size, string length, int ambient, int grouped, string rating, string curve, string current, string reading,
        (bool Ring, bool Rcd, bool Read) switches)
    {
        var stated = new Dictionary<string, string>
        {
            ["device.standard"] = "EN 60898",
            ["device.curve"] = curve,
            ["device.rating"] = rating,
            ["device.breaking-capacity"] = "6 kA",
            ["serves"] = "[fixed-equipment]",
            ["load.current"] = current,
            ["load.power-factor"] = "0.9 ± 5 %",
            ["leg.construction"] = "flat twin and earth",
            ["leg.insulation"] = "thermoplastic 70",
            ["leg.csa"] = size,
            ["leg.length"] = length,
            ["leg.method"] = "C",
            ["leg.ambient"] = $"{ambient} °C ± 4 K",
            ["leg.grouped-circuits"] = $"{grouped}",
            ["leg.grouping"] = "bunched",
        };
        if (switches.Ring)
        {
            stated["arrangement"] = "ring";
        }

        if (switches.Rcd)
        {
            stated["rcd.type"] = "A";
            stated["rcd.residual-current"] = "30 mA";
        }

        if (switches.Read)
        {
            stated["readings.zs"] = reading;
        }

        return stated;
    }

    private static Plan Join(
        Dictionary<string, string> origin, Dictionary<string, string> feeder, List<Dictionary<string, string>> final, List<Dictionary<string, string>> below)
    {
        var stated = new Dictionary<(string, string), string>();
        var isThreePhase = origin["supply.phases"] == "3";
        Enter("-", origin);
        Enter("MB/F", feeder, isThreePhase ? "L1-L2-L3" : null);
        stated[("MB/F", "feeds")] = "SB";
        for (var i = 0; i < final.Count; i++)
        {
            Enter($"MB/{i + 1}", final[i], isThreePhase ? "L1" : null);
        }

        for (var i = 0; i < below.Count; i++)
        {
            Enter($"SB/{i + 1}", below[i], isThreePhase ? "L2" : null);
        }

        return new Plan(stated, [("MB", [("F", 1), .. Circuits(final.Count)]), ("SB", Circuits(below.Count))]);

        void Enter(string subject, Dictionary<string, string> entries, string? phase = null)
        {
            foreach (var (path, text) in entries)
            {
                stated[path.StartsWith("leg.", StringComparison.Ordinal) ? ($"{subject}/leg 1", path[4..]) : (subject, path)] = text;
            }

            if (phase is not null)
            {
                stated[(subject, "phase")] = phase;
            }
        }
    }

    private static (string, int)[] Circuits(int count) => [.. Enumerable.Range(1, count).Select(number => ($"{number}", 1))];
}
