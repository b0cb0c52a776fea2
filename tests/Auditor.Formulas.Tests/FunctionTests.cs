namespace Auditor.Formulas.Tests;

/// <summary>
/// Every function with values from outside: constants of the On-Line Encyclopedia of Integer Sequences (its number beside each), and
/// the sine and cosine of 0.5 of Abramowitz and Stegun, Handbook of Mathematical Functions, table 4.6.
/// </summary>
public class FunctionTests
{
    [Theory]
    [InlineData("sqrt(2)", 1.4142135623730951, "A002193")]
    [InlineData("sqrt(3)", 1.7320508075688772, "A002194")]
    [InlineData("2 ^ 0.5", 1.4142135623730951, "A002193")]
    [InlineData("log(10)", 2.302585092994046, "A002392")]
    [InlineData("log(2)", 0.6931471805599453, "A002162")]
    [InlineData("log10(2)", 0.3010299956639812, "A007524")]
    [InlineData("log10(1000)", 3, "")]
    [InlineData("exp(1)", 2.718281828459045, "A001113")]
    [InlineData("exp(0)", 1, "")]
    [InlineData("sin(0.5)", 0.479425538604203, "A&S 4.6")]
    [InlineData("cos(0.5)", 0.8775825618903728, "A&S 4.6")]
    [InlineData("acos(0.5)", 1.0471975511965976, "A019670")]
    [InlineData("acos(0 - 1)", 3.141592653589793, "A000796")]
    [InlineData("abs(-3)", 3, "")]
    [InlineData("abs(3)", 3, "")]
    [InlineData("min(3, 1, 2)", 1, "")]
    [InlineData("min(-3, -1)", -3, "")]
    [InlineData("max(3, 1, 2)", 3, "")]
    [InlineData("max(1, 2, 3, 4, 5)", 5, "")]
    public void A_function_gives_the_value_that_is_published(string formula, double value, string source)
    {
        Assert.NotNull(source);
        Assert.Equal(value, Bound.Number(formula), 1e-14);
    }

    [Theory]
    [InlineData("min(2 kV, 230 V)", 230)]
    [InlineData("max(20 degC, -5 degC)", 20)]
    [InlineData("min(20 degC, -5 degC)", -5)]
    [InlineData("abs(-2 mm2)", 2e-6)]
    [InlineData("sqrt(16 m2)", 4)]
    public void Quantities_keep_their_unit_through_functions(string formula, double coherent) =>
        Assert.Equal(coherent, Bound.Number(formula), Math.Abs(coherent) * 1e-15);

    [Theory]
    [InlineData("choose(true, 1, 2)", "1")]
    [InlineData("choose(false, 1, 2)", "2")]
    [InlineData("choose(2 > 1, 'ring', 'radial')", "ring")]
    [InlineData("choose(2 < 1, true, false)", "false")]
    [InlineData("choose(true, none, none)", "")]
    [InlineData("one_of(kind, 'ring')", "true")]
    [InlineData("one_of(kind, 'radial')", "false")]
    [InlineData("one_of(kind, 'radial', 'ring')", "true")]
    [InlineData("one_of('x', 'y', 'x')", "true")]
    [InlineData("has(serves, 'lighting')", "true")]
    [InlineData("has(serves, 'socket-outlets')", "false")]
    [InlineData("has(none, 'lighting')", "false")]
    [InlineData("given(kind)", "true")]
    [InlineData("given(Z)", "false")]
    [InlineData("given(1 / 0)", "false")]
    [InlineData("given(Z + 1 ohm)", "false")]
    [InlineData("given(rcd)", "true")]
    [InlineData("given(fed.rcd)", "false")]
    [InlineData("given(none)", "true")]
    [InlineData("kind == 'ring'", "true")]
    [InlineData("kind != 'ring'", "false")]
    [InlineData("kind == 'radial'", "false")]
    [InlineData("'A' == 'a'", "false")]
    [InlineData("on == true", "true")]
    [InlineData("on != false", "true")]
    [InlineData("on == wet", "false")]
    [InlineData("!on", "false")]
    [InlineData("!wet", "true")]
    public void Words_and_flags_are_asked_for(string formula, string expected)
    {
        var circuit = new Thing(Plant.Circuit).Say(("kind", "ring"), ("on", "true"), ("wet", "false"), ("rcd", "true"));
        circuit.Say("serves", Values.Value.Of(["lighting"]));

        Assert.Equal(expected, Bound.Shown(Bound.Value(formula, circuit)));
    }

    [Theory]
    [InlineData("round_up_to('sizes', 0.2 mm2)", 1e-6)]
    [InlineData("round_up_to('sizes', 1 mm2)", 1e-6)]
    [InlineData("round_up_to('sizes', 1.0000000001 mm2)", 1e-6)]
    [InlineData("round_up_to('sizes', 1.00001 mm2)", 1.5e-6)]
    [InlineData("round_up_to('sizes', 2.4 mm2)", 2.5e-6)]
    [InlineData("round_up_to('sizes', 4 mm2)", 4e-6)]
    [InlineData("round_up_to('sizes', -4 mm2)", 1e-6)]
    public void A_size_is_rounded_up_to_the_next_of_its_series(string formula, double coherent) => Assert.Equal(coherent, Bound.Number(formula));

    [Fact]
    public void Above_the_last_size_there_is_none()
    {
        var value = Bound.Value("round_up_to('sizes', 4.1 mm2)");

        Assert.Equal("sizes holds nothing from 4.1 mm² upward; run cables in parallel", Bound.Reasons(value));
    }
}
