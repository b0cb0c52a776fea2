using System.Numerics;

namespace Auditor.Rules.Tests.Network;

/// <summary>A cable run of a random design, and its impedances as the textbook has them.</summary>
/// <param name="Csa">Cross-sectional area of the line conductors, mm².</param>
/// <param name="Neutral">Cross-sectional area of the neutral, mm²; null where it is as the lines.</param>
/// <param name="Cpc">Cross-sectional area of the protective conductor, mm².</param>
/// <param name="Stated">Resistances and reactance per metre where the design states them; null to go by the sizes.</param>
/// <param name="Parallel">Equal cables in parallel.</param>
/// <param name="Length">Length in metres; of a ring from end to end.</param>
/// <param name="HasOwnCpc">Whether each cable has the protective conductor as a core; otherwise one lies beside them all.</param>
/// <param name="IsThermosetting">Insulation for 90 °C; otherwise for 70 °C.</param>
internal sealed record Cable(
    double Csa, double? Neutral, double Cpc, PerMetre? Stated, int Parallel, double Length, bool HasOwnCpc, bool IsThermosetting)
{
    /// <summary>IEC 60228, copper, class 2, mΩ/m at 20 °C.</summary>
    private static readonly Dictionary<double, double> CopperAt20 = new()
    {
        [1.5] = 12.1,
        [2.5] = 7.41,
        [4] = 4.61,
        [6] = 3.08,
        [10] = 1.83,
        [16] = 1.15,
    };

    public static IEnumerable<double> Sizes => CopperAt20.Keys;

    /// <summary>From 20 °C to operating temperature, On-Site Guide: 1.20 at 70 °C, 1.28 at 90 °C.</summary>
    private double Hot => IsThermosetting ? 1.28 : 1.20;

    private double LineResistance => Stated?.LineResistance ?? CopperAt20[Csa];

    private double NeutralResistance => Neutral is { } size ? CopperAt20[size] : LineResistance;

    /// <summary>A line conductor at 20 °C, Ω.</summary>
    public Complex LineCold => Live(LineResistance);

    /// <summary>A line conductor at operating temperature, Ω.</summary>
    public Complex LineHot => Live(LineResistance * Hot);

    /// <summary>The neutral conductor at 20 °C, Ω.</summary>
    public Complex NeutralCold => Live(NeutralResistance);

    /// <summary>The neutral conductor at operating temperature, Ω.</summary>
    public Complex NeutralHot => Live(NeutralResistance * Hot);

    /// <summary>The protective conductor when a fault begins, Ω; one beside the cables is at 30 °C (On-Site Guide: 1.04).</summary>
    public Complex Protective
    {
        get
        {
            var resistance = (Stated?.ProtectiveResistance ?? CopperAt20[Cpc]) * (HasOwnCpc ? Hot : 1.04);
            return new Complex(resistance, Stated?.Reactance ?? 0) * Length / (HasOwnCpc ? Parallel : 1) / 1000;
        }
    }

    private Complex Live(double resistance) => new Complex(resistance, Stated?.Reactance ?? 0) * Length / Parallel / 1000;
}
