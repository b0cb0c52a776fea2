namespace Auditor.Quantities.Tests;

/// <summary>Each faulty text with the part that is marked, and what is said of it.</summary>
public class QuantityFaultTests
{
    [Theory]
    [InlineData("", "", "nothing stands where a quantity is due")]
    [InlineData("   ", "", "nothing stands where a quantity is due")]
    [InlineData("m 5", "m", "a quantity begins with a number, not with `m`")]
    [InlineData("about 5 m", "about", "a quantity begins with a number, not with `about`")]
    [InlineData("~5 m", "~5", "a quantity begins with a number, not with `~5`")]
    [InlineData("-", "-", "a quantity begins with a number, not with `-`")]
    [InlineData(". m", ".", "a quantity begins with a number, not with `.`")]
    [InlineData("±5 m", "±5", "a quantity begins with a number, not with `±5`")]
    [InlineData("NaN m", "NaN", "`NaN` is not a finite number")]
    [InlineData(".nan", ".nan", "`.nan` is not a finite number")]
    [InlineData("-.inf V", "-.inf", "`-.inf` is not a finite number")]
    [InlineData("Infinity", "Infinity", "`Infinity` is not a finite number")]
    [InlineData("-∞ A", "-∞", "`-∞` is not a finite number")]
    [InlineData("2,5 mm²", ",", "a comma stands inside the number")]
    [InlineData("10 m ± 1,5 m", ",", "a comma stands inside the number")]
    [InlineData("1 000 m", "000 m", "a number is followed by a second one, `000 m`")]
    [InlineData("5 1", "1", "a number is followed by a second one, `1`")]
    [InlineData("1.2.3 m", ".3 m", "`.3 m` is not a unit")]
    [InlineData("5 furlong", "furlong", "`furlong` is not a unit")]
    [InlineData("5 e", "e", "`e` is not a unit")]
    [InlineData("5 mV/A·m", "mV/A·m", "`mV/A·m` is not a unit")]
    [InlineData("5 m 3 cm", "m 3 cm", "`m 3 cm` is not a unit")]
    [InlineData("5 \u0007x", "\u0007x", "`\uFFFDx` is not a unit")]
    [InlineData("5 m ±", "", "the tolerance lacks its number")]
    [InlineData("5 m ± m", "m", "the tolerance lacks its number")]
    [InlineData("5 m ± -1 m", "-1", "the tolerance lacks its number")]
    [InlineData("5 m + x", "x", "the tolerance lacks its number")]
    [InlineData("5 m ± 2", "", "the tolerance lacks its unit")]
    [InlineData("5 m +3 m -0", "", "the tolerance lacks its unit")]
    [InlineData("5 m ± 2 kg", "kg", "`kg` is not a unit")]
    [InlineData("5 m ± 2 s", "s", "a tolerance in `s` does not fit a value in `m`")]
    [InlineData("5 % ± 2 s", "s", "a tolerance in `s` does not fit a value in `%`")]
    [InlineData("5 ± 2 m", "m", "the tolerance is in `m`, the value has no unit")]
    [InlineData("5-7 m", "m", "the tolerance is in `m`, the value has no unit")]
    [InlineData("30 °C ± 10 %", "%", "a tolerance in `%` does not fit a temperature, whose zero is arbitrary")]
    [InlineData("5 m +3 m", "", "the tolerance has one side only: the one with `-` is missing")]
    [InlineData("5 m -3 m", "", "the tolerance has one side only: the one with `+` is missing")]
    [InlineData("5 m +3 m +1 m", "", "the tolerance has one side only: the one with `-` is missing")]
    [InlineData("5 m +3 m -200 mm", "200 mm", "the sides of the tolerance are in different units, `m` and `mm`")]
    [InlineData("5 m ± 1 m ± 2 m", "± 2 m", "`± 2 m` follows a quantity that is complete")]
    [InlineData("5 m,", "", "no word follows the comma")]
    [InlineData("5 m, guessed", "guessed", "`guessed` does not say how the value is known")]
    [InlineData("5 m, Assumed", "Assumed", "`Assumed` does not say how the value is known")]
    [InlineData("5 m, assumed, measured", "assumed, measured", "`assumed, measured` does not say how the value is known")]
    [InlineData("-274 °C", "-274 °C", "the temperature lies below absolute zero, -273.15 °C")]
    [InlineData("2e15 m", "2e15", "the number is beyond any sense: above 1e15, as written or in base units")]
    [InlineData("1e400 m", "1e400", "the number is beyond any sense: above 1e15, as written or in base units")]
    [InlineData("-2e15 m", "2e15", "the number is beyond any sense: above 1e15, as written or in base units")]
    [InlineData("2e12 km, assumed", "2e12 km", "the number is beyond any sense: above 1e15, as written or in base units")]
    [InlineData("5 m ± 2e14 km", "± 2e14 km", "the number is beyond any sense: above 1e15, as written or in base units")]
    [InlineData("1e-16 m", "1e-16", "the number is beyond any sense: below 1e-15 but not zero, as written or in base units")]
    [InlineData("1e-400 m", "1e-400", "the number is beyond any sense: below 1e-15 but not zero, as written or in base units")]
    [InlineData("1e-10 mm²", "1e-10 mm²", "the number is beyond any sense: below 1e-15 but not zero, as written or in base units")]
    public void A_fault_marks_its_place_and_says_what_is_wrong(string text, string marked, string message)
    {
        QuantityFault fault = FaultOf(text);

        Assert.Equal(message, fault.Message);
        Assert.Equal(marked, text.Substring(fault.Start, fault.Length));
        Assert.NotEmpty(fault.Help);
    }

    [Fact]
    public void A_missing_unit_of_a_tolerance_is_missed_behind_its_number()
    {
        Assert.Equal(7, FaultOf("5 m ± 2").Start);
        Assert.Equal(7, FaultOf("5 m ± 2 , assumed").Start);
    }

    [Fact]
    public void A_unit_in_the_wrong_case_is_put_right()
    {
        Assert.Equal("did you mean `kW`? Capital and small letters differ in meaning", FaultOf("5 KW").Help);
        Assert.Equal("did you mean `mΩ` or `MΩ`? Capital and small letters differ in meaning", FaultOf("5 MOHM").Help);
        Assert.Equal("did you mean `mm²`? Capital and small letters differ in meaning", FaultOf("5 MM2").Help);
    }

    [Fact]
    public void A_tolerance_of_a_pure_number_is_asked_for_in_plain_numbers()
    {
        Assert.Equal("write it in per cent, `%`, or in plain numbers", FaultOf("5 % ± 2 s").Help);
        Assert.Equal("write it in per cent, `%`, or in `m`", FaultOf("5 m ± 2").Help);
    }

    [Fact]
    public void A_long_text_is_quoted_by_its_first_forty_characters()
    {
        string forty = new('x', 40);

        Assert.Equal($"`{forty}` is not a unit", FaultOf($"5 {forty}").Message);
        Assert.Equal($"`{forty}…` is not a unit", FaultOf($"5 {forty}y").Message);
    }

    private static QuantityFault FaultOf(string text)
    {
        Assert.False(QuantityText.TryParse(text, out StatedQuantity? stated, out QuantityFault? fault), $"{text} was read as {stated}");
        return fault;
    }
}
