using System.Diagnostics;
using CsCheck;

namespace Auditor.Quantities.Tests;

public class QuantityTextRoundTripTests
{
    private static readonly Gen<string> Garbage = Gen.OneOf(
        Gen.String,
        Gen.OneOf(
            "1", "2.5", "0", ".", "e", "E9", "m", "mm²", " ", "\t", "±", "+", "-", "/", "+-", "+/-", "%", ",", "assumed", "°C", "1/K", "^",
            "√", "\0", "\uD800", "NaN", "1e400", "1e-400", "−", "½")
            .Array[0, 14].Select(string.Concat));

    [Fact]
    public void What_is_written_reads_back_exactly() =>
        Generators.Stated.Sample(
            stated =>
            {
                string text = QuantityText.Write(stated);
                Assert.True(QuantityText.TryParse(text, out StatedQuantity? back, out QuantityFault? fault), $"{text}: {fault}");
                Assert.Equal(stated, back);
                Assert.Equal(text, QuantityText.Write(back));
            },
            iter: 50_000);

    [Fact]
    public void A_value_that_was_worked_out_reads_back_within_a_unit_in_the_last_place() =>
        Gen.Select(Gen.Double[1e-3, 1e6], Gen.OneOf(UnitCatalog.All.ToArray())).Sample(
            (coherent, unit) =>
            {
                var stated = new StatedQuantity(new Quantity(coherent, unit.Dimension), unit, Tolerance: null, Standing.Designed);
                Assert.True(QuantityText.TryParse(QuantityText.Write(stated), out StatedQuantity? back, out _));
                double next = Math.BitIncrement(coherent) - coherent;
                Assert.InRange(back.Quantity.Value, coherent - next, coherent + next);
            },
            iter: 50_000);

    [Fact]
    public void No_text_makes_the_reader_throw_and_every_fault_has_its_place_and_help() =>
        Garbage.Sample(
            text =>
            {
                if (QuantityText.TryParse(text, out StatedQuantity? stated, out QuantityFault? fault))
                {
                    Assert.Null(fault);
                    Assert.True(double.IsFinite(stated.Quantity.Value));
                    return;
                }

                Assert.Null(stated);
                Assert.InRange(fault.Start, 0, text.Length);
                Assert.InRange(fault.Length, 0, text.Length - fault.Start);
                Assert.NotEmpty(fault.Message);
                Assert.NotEmpty(fault.Help);
                Assert.DoesNotContain(fault.Message, char.IsControl);
                Assert.InRange(fault.Message.Length, 1, 200);
            },
            iter: 100_000);

    [Theory]
    [InlineData("1")]
    [InlineData(" ")]
    [InlineData("m")]
    [InlineData("1 m ± ")]
    [InlineData("m·")]
    [InlineData("1e")]
    [InlineData("+-")]
    [InlineData("½^")]
    [InlineData(",")]
    public void A_text_of_millions_of_characters_takes_linear_time(string part)
    {
        string text = string.Concat(Enumerable.Repeat(part, 4_000_000 / part.Length));
        var watch = Stopwatch.StartNew();

        Assert.False(QuantityText.TryParse(text, out _, out _));
        Assert.Equal(part == " ", QuantityText.TryParse($"1 {text}", out _, out _));
        Assert.InRange(watch.Elapsed.TotalSeconds, 0, 10);
    }

    [Fact]
    public void Reading_allocates_nothing_but_its_result()
    {
        const int Readings = 10_000;
        const int SizeOfResult = 64;
        Assert.True(QuantityText.TryParse("7.41 mΩ/m, measured", out _, out _));

        long before = GC.GetAllocatedBytesForCurrentThread();
        for (int reading = 0; reading < Readings; reading++)
        {
            _ = QuantityText.TryParse("7.41 mΩ/m, measured", out _, out _);
        }

        Assert.InRange(GC.GetAllocatedBytesForCurrentThread() - before, 0, Readings * SizeOfResult);
    }
}
