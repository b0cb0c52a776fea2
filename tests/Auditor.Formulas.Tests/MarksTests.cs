using Auditor.Formulas.Values;

namespace Auditor.Formulas.Tests;

/// <summary>
/// What a value rests on. <c>Z</c>, <c>n</c>, <c>wet</c> and <c>kind</c> hang on assumptions, <c>R</c> and <c>on</c> do not; the row of 2.5 mm² and the
/// second line of the breaker curve are from memory.
/// </summary>
public class MarksTests
{
    private static Thing Circuit
    {
        get
        {
            var circuit = new Thing(Plant.Circuit).Say(("Z", "1 Ω, assumed"), ("n", "2, assumed"), ("R", "2 Ω, measured"), ("X", "1 Ω, declared"), ("on", "true"));
            circuit.Say("wet", Value.Of(true, Marks.Assumed)).Say("kind", Value.Of("ring", Marks.Assumed));
            circuit.Say("serves", Value.Of(["lighting"], Marks.Assumed)).Say("S", Value.Of(2.5e-6, Marks.Assumed));
            return circuit;
        }
    }

    [Theory]
    [InlineData("R", Marks.None)]
    [InlineData("R + X", Marks.None)]
    [InlineData("Z", Marks.Assumed)]
    [InlineData("Z + R", Marks.Assumed)]
    [InlineData("R - Z", Marks.Assumed)]
    [InlineData("2 * Z", Marks.Assumed)]
    [InlineData("R / Z", Marks.Assumed)]
    [InlineData("Z ^ 2", Marks.Assumed)]
    [InlineData("1 ^ n", Marks.Assumed)]
    [InlineData("-Z", Marks.Assumed)]
    [InlineData("!wet", Marks.Assumed)]
    [InlineData("Z <= R", Marks.Assumed)]
    [InlineData("R == Z", Marks.Assumed)]
    [InlineData("kind == 'ring'", Marks.Assumed)]
    [InlineData("min(R, Z)", Marks.Assumed)]
    [InlineData("max(R, Z)", Marks.Assumed)]
    [InlineData("sqrt(n)", Marks.Assumed)]
    [InlineData("choose(wet, R, X)", Marks.Assumed)]
    [InlineData("choose(on, Z, R)", Marks.Assumed)]
    [InlineData("choose(on, R, Z)", Marks.None)]
    [InlineData("given(Z)", Marks.Assumed)]
    [InlineData("given(U)", Marks.None)]
    [InlineData("Z ?? R", Marks.Assumed)]
    [InlineData("U ?? 1 V", Marks.None)]
    [InlineData("R ?? Z", Marks.None)]
    [InlineData("one_of(kind, 'ring')", Marks.Assumed)]
    [InlineData("has(serves, 'lighting')", Marks.Assumed)]
    [InlineData("on && wet", Marks.Assumed)]
    [InlineData("on || wet", Marks.None)]
    [InlineData("wet || on", Marks.Assumed)]
    [InlineData("!on && wet", Marks.None)]
    [InlineData("wet && !on", Marks.None)]
    [InlineData("Z + U * R / U", Marks.Assumed)]
    [InlineData("1 / (n - n)", Marks.Assumed)]
    [InlineData("table('capacity', 1.5 mm2, 'C')", Marks.None)]
    [InlineData("table('capacity', 2.5 mm2, 'C')", Marks.FromMemory)]
    [InlineData("table('capacity', S, 'C')", Marks.FromMemory | Marks.Assumed)]
    [InlineData("table('words', kind)", Marks.Assumed)]
    [InlineData("table('line', 15, 'left')", Marks.None)]
    [InlineData("table('line', 30, 'left')", Marks.FromMemory)]
    [InlineData("round_up_to('sizes', 2 mm2)", Marks.None)]
    [InlineData("round_up_to('sizes', 3 mm2)", Marks.FromMemory)]
    [InlineData("round_up_to('sizes', S)", Marks.Assumed)]
    [InlineData("round_up_to('sizes', S + 1 mm2)", Marks.FromMemory | Marks.Assumed)]
    [InlineData("trip_current('EN 60898', 'B', 32 A, 5 s)", Marks.None)]
    [InlineData("trip_current('EN 60898', 'B', 63 A, 5 s)", Marks.FromMemory)]
    [InlineData("trip_time('BS 88-3', kind, 32 A, 50 A)", Marks.FromMemory | Marks.Assumed)]
    [InlineData("trip_time('EN 60898', 'B', 16 A * n, 200 A)", Marks.Assumed)]
    public void A_value_bears_the_marks_of_all_that_decides_it(string formula, Marks marks) => Assert.Equal(marks, Bound.Value(formula, Circuit).Marks);

    [Theory]
    [InlineData("sum_of(legs, length)", Marks.Assumed)]
    [InlineData("min_of(legs, length)", Marks.Assumed)]
    [InlineData("max_of(legs, length)", Marks.Assumed)]
    [InlineData("count_of(legs, length > 5 m)", Marks.Assumed)]
    [InlineData("all_of(legs, length > 1 m)", Marks.Assumed)]
    [InlineData("all_of(legs, length > 15 m)", Marks.None)]
    [InlineData("any_of(legs, length > 15 m)", Marks.Assumed)]
    [InlineData("any_of(legs, length < 15 m)", Marks.None)]
    [InlineData("sum_of(legs, r * (1 m))", Marks.None)]
    public void A_collection_bears_the_marks_of_the_items_that_decide_it(string formula, Marks marks)
    {
        var first = new Thing(Plant.Leg).Say(("length", "10 m"), ("r", "7.41 mΩ/m"));
        var second = new Thing(Plant.Leg).Say(("length", "20 m, assumed"), ("r", "7.41 mΩ/m"));

        Assert.Equal(marks, Bound.Value(formula, new Thing(Plant.Circuit).Hold("legs", first, second)).Marks);
    }
}
