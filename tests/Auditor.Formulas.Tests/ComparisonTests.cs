using Auditor.Formulas.Values;

namespace Auditor.Formulas.Tests;

/// <summary>Comparisons just below, at and just above a limit, with the relative slack of 1e-9 on the side of keeping it.</summary>
public class ComparisonTests
{
    private const double Within = 1.37 * (1 + 9e-10);
    private const double Beyond = 1.37 * (1 + 1.1e-9);
    private const double WithinBelow = 1.37 * (1 - 9e-10);
    private const double BeyondBelow = 1.37 * (1 - 1.1e-9);

    [Theory]
    [InlineData(BeyondBelow, true, false, true, false, false)]
    [InlineData(WithinBelow, true, true, false, false, true)]
    [InlineData(1.37, true, true, false, false, true)]
    [InlineData(Within, true, true, false, false, true)]
    [InlineData(Beyond, false, true, false, true, false)]
    public void A_number_within_the_slack_of_its_limit_is_at_it(double number, bool atMost, bool atLeast, bool less, bool greater, bool equal)
    {
        var circuit = new Thing(Plant.Circuit).Say("Z", Value.Of(number));
        var word = (bool holds) => holds ? "true" : "false";

        Assert.Equal(word(atMost), Bound.Truth("Z <= 1.37 ohm", circuit));
        Assert.Equal(word(atLeast), Bound.Truth("Z >= 1.37 ohm", circuit));
        Assert.Equal(word(less), Bound.Truth("Z < 1.37 ohm", circuit));
        Assert.Equal(word(greater), Bound.Truth("Z > 1.37 ohm", circuit));
        Assert.Equal(word(equal), Bound.Truth("Z == 1.37 ohm", circuit));
        Assert.Equal(word(!equal), Bound.Truth("Z != 1.37 ohm", circuit));
    }

    [Fact]
    public void The_last_bits_of_arithmetic_decide_nothing()
    {
        Assert.NotEqual(0.3, 0.1 + 0.2);
        Assert.Equal("true", Bound.Truth("0.1 + 0.2 == 0.3"));
        Assert.Equal("true", Bound.Truth("0.1 + 0.2 <= 0.3"));
        Assert.Equal("false", Bound.Truth("0.1 + 0.2 > 0.3"));
    }

    [Theory]
    [InlineData("0 == 0", "true")]
    [InlineData("1.0e-300 == 0", "false")]
    [InlineData("1.0e-300 <= 0", "false")]
    [InlineData("-1.0e-300 <= 0", "true")]
    [InlineData("-1 < 1", "true")]
    [InlineData("-1 >= -1", "true")]
    [InlineData("-1.000000002 >= -1", "false")]
    [InlineData("-1.0000000009 >= -1", "true")]
    public void Zero_has_no_slack_and_negatives_have_the_same(string formula, string expected) => Assert.Equal(expected, Bound.Truth(formula));

    [Theory]
    [InlineData(1.0, 1.0, true)]
    [InlineData(1.0, 1.0 + 9e-10, true)]
    [InlineData(1.0 + 9e-10, 1.0, true)]
    [InlineData(1.0, 1.0 + 1.1e-9, false)]
    [InlineData(0.0, 0.0, true)]
    [InlineData(-2.0, 2.0, false)]
    [InlineData(double.MaxValue, -double.MaxValue, false)]
    public void Sameness_is_relative(double a, double b, bool same)
    {
        Assert.Equal(same, Comparison.Same(a, b));
        Assert.Equal(same, Comparison.Same(b, a));
    }
}
