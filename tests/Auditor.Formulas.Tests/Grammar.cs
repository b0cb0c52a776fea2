using CsCheck;

namespace Auditor.Formulas.Tests;

/// <summary>Random formulas of a circuit that are right by their making.</summary>
internal static class Grammar
{
    /// <summary>The inputs that plain formulas name, with what turns each into a pure number.</summary>
    public static readonly (string Name, string Text)[] Names = [("n", "n"), ("share", "share"), ("Z", "Z / (1 ohm)"), ("U", "U / (1 V)")];

    private static Gen<Piece> Atoms { get; } = Gen.OneOf(
        Gen.Int[0, 12].Select(number => Piece.Of(0, _ => (double)number, $"{number}")),
        Gen.OneOf(0.5, 1.25, 0.003, 17.5, 1000.75).Select(number => Piece.Of(0, _ => number, $"{number}")),
        Gen.OneOf(5, 20, 100).Select(number => Piece.Of(Piece.Loosest, _ => number / 100.0, $"{number} percent")),
        Gen.OneOf(Names).Select(name => Piece.Of(name.Text == name.Name ? 0 : 2, values => values.TryGetValue(name.Name, out var value) ? value : null, name.Text)));

    private static Gen<Piece> RichAtoms { get; } = Gen.OneOf(
        "count_of(legs, buried)", "sum_of(legs, r * length) / (1 ohm)", "max_of(legs, length / (1 m) + this.n)", "up.up.Zs / (1 ohm)", "param.cmin", "origin.Ze / up.Zdb",
        "sum_of(legs, sqrt(length / up.L))", "min_of(legs, (theta - 20 degC) / (1 K))", "choose(kind == 'ring', 4, 1)", "Zs / (1 ohm)", "fed.Zdb / fed.up.Zs",
        "trip_current(device.standard, device.curve ?? 'any', device.rating, 0.4 s) / Ib", "choose(given(rcd), 1, 0)", "1 + alpha * (theta - 20 degC)")
        .Select(text => Piece.Opaque(Piece.Loosest, text));

    private static Gen<Piece> RichFlags { get; } = Gen.OneOf(
        "on", "wet", "kind == 'ring'", "has(serves ?? none, 'lighting')", "matches(kind ?? 'ring', 'r.*')", "any_of(legs, buried && length > 5 m)", "all_of(legs, theta < this.theta)", "given(rcd)",
        "theta - 20 degC > delta", "one_of(device.standard, 'EN 60898', 'BS 88-3')", "origin.system != 'TT'", "given(fed.Zdb)", "table('words', kind ?? 'spur') == 'red'")
        .Select(text => Piece.Opaque(Piece.Loosest, text));

    /// <summary>Formulas of numbers, whose value is known without the program.</summary>
    public static Gen<Piece> Plain { get; } = Numbers(4, isRich: false);

    /// <summary>Formulas with everything that the language has.</summary>
    public static Gen<Piece> Rich { get; } = Numbers(4, isRich: true);

    private static Gen<Piece> Numbers(int depth, bool isRich)
    {
        var leaves = isRich ? Gen.Frequency((2, Atoms), (1, RichAtoms)) : Atoms;
        if (depth == 0)
        {
            return leaves;
        }

        var inner = Numbers(depth - 1, isRich);
        var plain = Gen.Frequency((2, leaves), (4, Gen.Select(inner, inner, Gen.OneOf('+', '-', '*', '/'), Binary)), (1, inner.Select(Negative)),
            (1, Gen.Select(inner, Gen.OneOf(2, 3), Power)), (2, Gen.Select(inner, inner, Gen.OneOf("min", "max"), Extreme)), (2, Functions(inner)),
            (1, Gen.Select(inner, inner, Coalesce)), (2, Gen.Select(Flags(depth - 1, isRich), inner, inner, Choose)));
        return isRich
            ? Gen.Frequency((4, plain), (1, inner.Select(x => Piece.Opaque(2, "table('line', ", x, ", 'left') / (1 A)"))),
                (1, inner.Select(x => Piece.Opaque(2, "round_up_to('sizes', ", x.Within(0), " * (1 mm2)) / (1 mm2)"))),
                (1, inner.Select(x => Piece.Opaque(2, "trip_time('EN 60898', 'B', 32 A, ", x.Within(0), " * (1 A)) / (1 s)"))))
            : plain;
    }

    private static Gen<Piece> Flags(int depth, bool isRich)
    {
        var numbers = Numbers(Math.Max(depth - 1, 0), isRich);
        var comparison = Gen.Select(numbers, numbers, Gen.OneOf("<", ">", "<=", ">="), Compare);
        var leaves = isRich ? Gen.Frequency((1, comparison), (1, RichFlags)) : comparison;
        return depth <= 0
            ? leaves
            : Gen.Frequency((3, leaves), (2, Gen.Select(leaves, leaves, Gen.Bool, Logic)), (1, leaves.Select(Not)), (1, numbers.Select(Given)));
    }

    private static Piece Binary(Piece a, Piece b, char sign)
    {
        var level = sign is '+' or '-' ? 3 : 2;
        return Piece.Of(
            level, values => (a.Value(values), b.Value(values)) is (double x, double y) ? Finite(Computed(x, y, sign)) : null,
            a.Within(level), $" {sign} ", b.Within(level - 1));
    }

    private static double Computed(double x, double y, char sign) => sign switch
    {
        '+' => x + y,
        '-' => x - y,
        '*' => x * y,
        _ => x / y,
    };

    private static Piece Negative(Piece a) => Piece.Of(1, values => a.Value(values) is double x ? -x : null, "-", a.Within(0));

    private static Piece Power(Piece a, int exponent) =>
        Piece.Of(1, values => a.Value(values) is double x ? Finite(exponent == 2 ? x * x : Math.Pow(x, exponent)) : null, a.Within(0), $" ^ {exponent}");

    private static Piece Extreme(Piece a, Piece b, string name) => Piece.Of(
        0, values => (a.Value(values), b.Value(values)) is (double x, double y) ? (name == "min") == (x < y) ? x : y : null, name, "(", a, ", ", b, ")");

    private static Gen<Piece> Functions(Gen<Piece> inner) => Gen.Select(
        inner,
        Gen.OneOf<(string Name, Func<double, double> Function)>(("sqrt", Math.Sqrt), ("abs", Math.Abs), ("log", Math.Log), ("exp", Math.Exp), ("sin", Math.Sin), ("cos", Math.Cos)),
        (a, f) => Piece.Of(0, values => a.Value(values) is double x ? Finite(f.Function(x)) : null, f.Name, "(", a, ")"));

    private static Piece Coalesce(Piece a, Piece b) => Piece.Of(Piece.Loosest, values => a.Value(values) ?? b.Value(values), a.Within(3), " ?? ", b.Within(3));

    private static Piece Choose(Piece condition, Piece a, Piece b) =>
        Piece.Of(0, values => condition.Value(values) is bool holds ? (holds ? a : b).Value(values) : null, "choose(", condition, ", ", a, ", ", b, ")");

    private static Piece Compare(Piece a, Piece b, string sign) => Piece.Of(
        Piece.Loosest,
        values => (a.Value(values), b.Value(values)) is (double x, double y) ? Holds(x, y, sign) : null,
        a.Within(3), $" {sign} ", b.Within(3));

    private static bool Holds(double x, double y, string sign)
    {
        var same = x == y || Math.Abs(x - y) <= 1e-9 * Math.Max(Math.Abs(x), Math.Abs(y));
        return sign switch
        {
            "<" => x < y && !same,
            ">" => x > y && !same,
            "<=" => x < y || same,
            _ => x > y || same,
        };
    }

    private static Piece Logic(Piece a, Piece b, bool isAnd) => Piece.Of(
        Piece.Loosest,
        values => (a.Value(values), b.Value(values)) switch
        {
            (bool x, bool y) => isAnd ? x && y : x || y,
            (bool x, null) when x != isAnd => x,
            (null, bool y) when y != isAnd => y,
            _ => null,
        },
        a.Within(3), isAnd ? " && " : " || ", b.Within(3));

    private static Piece Not(Piece a) => Piece.Of(1, values => a.Value(values) is bool x ? !x : null, "!", a.Within(0));

    private static Piece Given(Piece a) => Piece.Of(0, values => a.Value(values) is not null, "given(", a, ")");

    private static double? Finite(double number) => double.IsFinite(number) ? number : null;
}
