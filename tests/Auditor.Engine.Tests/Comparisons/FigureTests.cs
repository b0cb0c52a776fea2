using Auditor.Engine.Comparisons;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.Tests.Comparisons;

public class FigureTests
{
    private static readonly Unit Ohm = UnitCatalog.Find("Ω")!;

    [Fact]
    public void A_quantity_has_its_number_and_what_is_shown_and_a_word_has_no_number()
    {
        Assert.Equal(new Figure(0.12345, "0.1235 Ω"), Figure.Of(Value.Of(0.12345), Ohm));
        Assert.Equal(new Figure(null, "ring"), Figure.Of(Value.Of("ring"), null));
        Assert.Equal(new Figure(null, "yes"), Figure.Of(Value.Of(true), null));
        Assert.Null(Figure.Of(Value.Missing(new Absence(AbsenceKind.Input, "", "", "not given", "")), Ohm));
    }

    [Fact]
    public void Numbers_that_show_alike_are_the_same_only_within_the_slack()
    {
        Assert.True(Figure.Same(Of(1.0), Of(1.0 + 1e-12)));
        Assert.False(Figure.Same(Of(1.0), Of(1.0 + 1e-7)));
    }

    [Fact]
    public void Words_are_the_same_to_the_letter_and_nothing_is_like_no_figure()
    {
        Assert.True(Figure.Same(new Figure(null, "ring"), new Figure(null, "ring")));
        Assert.False(Figure.Same(new Figure(null, "ring"), new Figure(null, "Ring")));
        Assert.False(Figure.Same(new Figure(null, "1 Ω"), new Figure(1, "2 Ω")));
        Assert.True(Figure.Same((Figure?)null, null));
        Assert.False(Figure.Same(Of(1.0), null));
    }

    [Fact]
    public void Lists_are_the_same_one_by_one()
    {
        Assert.True(Figure.Same([Of(1), Of(2)], [Of(1), Of(2)]));
        Assert.False(Figure.Same([Of(1), Of(2)], [Of(1), Of(3)]));
        Assert.False(Figure.Same([Of(1), Of(2)], [Of(1)]));
    }

    private static Figure Of(double ohms) => new(ohms, "1 Ω");
}
