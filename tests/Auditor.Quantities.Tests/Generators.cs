using CsCheck;

namespace Auditor.Quantities.Tests;

/// <summary>Random dimensions, units and stated quantities of every form that a file can hold.</summary>
internal static class Generators
{
    private static readonly Gen<int> SmallExponent = Gen.Int[-6, 6];

    private static readonly Gen<string> FactorWord = Gen.OneOf(
        "V", "kV", "A", "mA", "Ω", "mohm", "m", "mm", "km", "s", "min", "h", "K", "W", "kVA", "var", "kWh", "Hz", "%");

    private static readonly Gen<string> ExponentWord = Gen.OneOf("", "", "", "²", "^½", "^-1", "³", "^1.5", "2");

    internal static Gen<Dimension> Combinable { get; } =
        from whole in Gen.Select(SmallExponent, SmallExponent, SmallExponent, SmallExponent, SmallExponent)
        from rooted in Gen.Bool
        select Halved(Dimension.Of(whole.Item1, whole.Item2, whole.Item3, whole.Item4, whole.Item5), rooted);

    internal static Gen<Dimension> Any { get; } = Gen.Frequency((9, Combinable), (1, Gen.Const(Dimension.Temperature)));

    /// <summary>Compound spellings; not every one is a unit, because factors may cancel.</summary>
    internal static Gen<string> CompoundSpelling { get; } =
        from multipliers in Gen.Select(FactorWord, ExponentWord, (unit, exponent) => unit + exponent).Array[1, 3]
        from divisors in Gen.Select(FactorWord, ExponentWord, (unit, exponent) => unit + exponent).Array[0, 3]
        select string.Join('·', multipliers) + string.Concat(divisors.Select(divisor => $"/{divisor}"));

    internal static Gen<Unit> Unit { get; } = Gen.Frequency(
        (3, Gen.OneOf(UnitCatalog.All.ToArray())),
        (1, CompoundSpelling.Select(spelling => UnitCatalog.Find(spelling)!)));

    /// <summary>Numbers as people write them, with 1 to 6 digits, and numbers with all the digits that a double has.</summary>
    internal static Gen<double> Number { get; } = Gen.OneOf(
        Gen.Select(Gen.Int[0, 999_999], Gen.Int[-3, 3], (digits, shift) => digits * Math.Pow(10, shift)),
        Gen.Double[0, 1000],
        Gen.Select(Gen.Double[1, 10], Gen.Int[-9, 9], (digits, shift) => digits * Math.Pow(10, shift)));

    internal static Gen<StatedQuantity> Stated { get; } =
        from unit in Unit
        from number in Gen.Select(Number, Gen.Bool, (number, negative) => negative ? 0 - number : number)
        where IsSensible(number, unit)
        from tolerance in ToleranceOf(Quantity.Of(number, unit), unit)
        from standing in Gen.Enum<Standing>()
        select new StatedQuantity(Quantity.Of(number, unit), unit, tolerance, standing);

    private static Gen<Tolerance?> ToleranceOf(Quantity value, Unit unit)
    {
        Unit percent = UnitCatalog.Find("%")!;
        Unit[] suitable =
        [
            .. UnitCatalog.Of(value.Dimension).Append(unit).Append(percent).Append(UnitCatalog.Find("K")!)
                .Where(candidate => Tolerance.Suits(candidate, value.Dimension)),
        ];
        Gen<double> side = Number.Where(number => number is 0 or > 1e-9 and < 1e6);
        return Gen.Frequency(
            (1, Gen.Const((Tolerance?)null)),
            (2, Gen.Select(side, Gen.OneOf(suitable), (both, own) => (Tolerance?)Tolerance.Of(both, both, own, value))),
            (2, Gen.Select(side, side, Gen.OneOf(suitable), (a, b, own) => (Tolerance?)Tolerance.Of(a, b, own, value))))
            .Where(tolerance => tolerance is null || Math.Max(tolerance.Below, tolerance.Above) <= 1e15);
    }

    private static bool IsSensible(double number, Unit unit)
    {
        double size = Math.Abs(unit.ToCoherent(number));
        bool tooCold = unit.Dimension.IsTemperature && number < -273.15;
        return number == 0 || (Math.Abs(number) >= 1e-15 && size is >= 1e-15 and <= 1e15 && !tooCold);
    }

    private static Dimension Halved(Dimension dimension, bool rooted) => rooted ? dimension.Sqrt() : dimension;
}
