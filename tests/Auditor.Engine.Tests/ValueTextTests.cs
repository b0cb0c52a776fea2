using Auditor.Engine.Findings;

namespace Auditor.Engine.Tests;

/// <summary>How numbers are shown. The sign of a margin tells which side of the limit a value is on, so zero has none and no margin beside zero loses it.</summary>
public class ValueTextTests
{
    [Theory]
    [InlineData(0, "0.0 %")]
    [InlineData(-4.441e-16, "0.0 %")]
    [InlineData(4.441e-16, "0.0 %")]
    [InlineData(0.25, "+25.0 %")]
    [InlineData(-0.25, "-25.0 %")]
    [InlineData(-6.8526, "-685.3 %")]
    [InlineData(0.0005, "+0.1 %")]
    [InlineData(-0.0005, "-0.1 %")]
    [InlineData(-0.0004, "-0.04 %")]
    [InlineData(0.000123, "+0.01 %")]
    [InlineData(-0.0000098, "-0.001 %")]
    [InlineData(-1.25e-9, "-0.0000001 %")]
    public void A_margin_is_shown_on_its_side_of_the_limit(double relative, string shown) => Assert.Equal(shown, ValueText.ShowMargin(relative));
}
