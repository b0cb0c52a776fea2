using Auditor.Formulas.Values;

namespace Auditor.Formulas.Tests;

/// <summary>What a value tells of itself where it holds something else than is asked for.</summary>
public class ValueTests
{
    [Fact]
    public void An_input_that_is_not_given_is_neither_true_nor_a_number()
    {
        const int Slot = 3;
        var value = Value.NotGiven(new Thing(Plant.Circuit, "MSB/1"), Slot).With(Marks.Assumed);

        Assert.Equal((true, false, false, false, 0.0, Marks.Assumed), (value.IsMissing, value.Flag, value.IsTrue, value.IsFalse, value.Number, value.Marks));
        Assert.Equal($"MSB/1: `{Plant.Circuit.Inputs[Slot].Path}` is not given", Assert.Single(value.Absences.Items).ToString());
    }

    [Fact]
    public void A_text_with_marks_is_neither_true_nor_a_number()
    {
        var value = Value.Of("ring", Marks.FromMemory);

        Assert.Equal(("ring", false, 0.0, Marks.FromMemory), (value.Text, value.Flag, value.Number, value.Marks));
    }

    [Fact]
    public void A_flag_is_one_or_nought() =>
        Assert.Equal((true, 1.0, false, 0.0), (Value.Of(true).Flag, Value.Of(true).Number, Value.Of(false, Marks.Assumed).Flag, Value.Of(false).Number));
}
