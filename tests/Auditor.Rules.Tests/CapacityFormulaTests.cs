using Auditor.Formulas.Values;

namespace Auditor.Rules.Tests;

/// <summary>
/// The capacity tables against the fitted formula of IEC 60364-5-52 Annex D, I = A·S^m with S in mm²: each cell that the
/// formula reaches lies within 2 % or 1 A of it.
/// </summary>
public class CapacityFormulaTests
{
    private const double SquareMillimetre = 1e-6;

    private static readonly string[] Lookups = ["current-capacity-iec", "current-capacity-iec-2001", "current-capacity"];

    public static IEnumerable<TheoryDataRow<string, string, double, double, double>> Cells() =>
        from name in Lookups
        from entry in Shipped.Lookup(name).Cells()
        where !entry.Cell.IsEmpty && Equals(Key(name, entry.Keys, "material"), "copper")
        let csa = (double)Key(name, entry.Keys, "csa")! / SquareMillimetre
        let method = (string)Key(name, entry.Keys, "method")!
        where IsFitted(name, Key(name, entry.Keys, "construction") as string, method, csa)
        let insulation = (string)Key(name, entry.Keys, "insulation")!
        let loaded = (double)Key(name, entry.Keys, "loaded")!
        where Formula(insulation, method, loaded, csa) is not null
        select new TheoryDataRow<string, string, double, double, double>(insulation, method, loaded, csa, entry.Cell.Number)
        {
            TestDisplayName = $"capacity · {name} · {string.Join(" · ", entry.Keys)} · {entry.Cell.Table.Id}",
        };

    [Theory]
    [MemberData(nameof(Cells))]
    public void A_tabulated_capacity_follows_the_fitted_formula(
        string insulation, string method, double loaded, double csa, double tabulated)
    {
        var fitted = Formula(insulation, method, loaded, csa)!.Value;
        Assert.Equal(fitted, tabulated, Math.Max(1, 0.02 * fitted));
    }

    [Fact]
    public void The_formula_reaches_enough_cells_to_be_a_check() => Assert.InRange(Cells().Count(), 300, int.MaxValue);

    /// <summary>
    /// What the coefficients were fitted to. BS 7671 has a column of its own for single-core cables clipped direct, and both
    /// standards have since lowered B1 and B2 from 150 mm², for which no coefficients are held.
    /// </summary>
    private static bool IsFitted(string lookup, string? construction, string method, double csa) =>
        construction is null or "multicore" or "single-core"
        && !(construction == "single-core" && method == "C")
        && !(lookup != "current-capacity-iec-2001" && method is "B1" or "B2" && csa > 120.5);

    /// <summary>The capacity by the formula; null where it does not reach. Nominal 50 mm² stands for 47.5 mm² in it.</summary>
    private static double? Formula(string insulation, string method, double loaded, double csa)
    {
        var a = Coefficient("capacity-formula-a", insulation, loaded, method, csa);
        var m = Coefficient("capacity-formula-m", insulation, loaded, method, csa);
        var area = Math.Abs(csa - 50) < 1e-6 ? 47.5 : csa;
        return csa < 1.4999 || a is null || m is null ? null : a * Math.Pow(area, m.Value);
    }

    private static double? Coefficient(string lookup, string insulation, double loaded, string method, double csa)
    {
        Value[] keys = [Value.Of(insulation), Value.Of(loaded), Value.Of(method), Value.Of(csa * SquareMillimetre)];
        var value = Shipped.Lookup(lookup).Find(keys, null);
        return value.IsMissing ? null : value.Number;
    }

    private static object? Key(string lookup, IReadOnlyList<object> keys, string wanted)
    {
        var at = Shipped.Lookup(lookup).Keys.Select(key => key.Name).ToList().IndexOf(wanted);
        return at < 0 ? null : keys[at];
    }
}
