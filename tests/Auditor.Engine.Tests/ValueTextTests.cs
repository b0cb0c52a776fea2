using Auditor.Engine.Findings;
using Auditor.Quantities;

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

    [Theory]
    [InlineData(12.3456, "Ω", true, "12.34 Ω")]
    [InlineData(12.3456, "Ω", false, "12.35 Ω")]
    [InlineData(12.34, "Ω", true, "12.34 Ω")]
    [InlineData(12.34, "Ω", false, "12.34 Ω")]
    [InlineData(0.0123456, "mΩ", true, "12.34 mΩ")]
    [InlineData(0.0123456, "mΩ", false, "12.35 mΩ")]
    [InlineData(-12.3456, "A", true, "-12.35 A")]
    [InlineData(-12.3456, "A", false, "-12.34 A")]
    [InlineData(98765, "V", true, "98760 V")]
    [InlineData(98765, "V", false, "98770 V")]
    [InlineData(1.005, "Ω", true, "1.005 Ω")]
    [InlineData(4.035, "Ω", false, "4.035 Ω")]
    [InlineData(0, "Ω", true, "0 Ω")]
    [InlineData(0, "Ω", false, "0 Ω")]
    public void A_bound_is_rounded_to_its_safe_side(double number, string unit, bool isMost, string shown) =>
        Assert.Equal(shown, ValueText.ShowBound(number, UnitCatalog.Find(unit)!, isMost));

    [Theory]
    [InlineData("conforms", Verdict.Conforms)]
    [InlineData("nonconforming", Verdict.Nonconforming)]
    [InlineData("unproven", Verdict.Unproven)]
    [InlineData("departed", Verdict.Departed)]
    [InlineData("undetermined", Verdict.Undetermined)]
    [InlineData("fine", null)]
    public void The_word_of_a_verdict_is_found_again(string word, Verdict? verdict) => Assert.Equal(verdict, VerdictWords.Find(word));
}
