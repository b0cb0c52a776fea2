using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Tests;

/// <summary>The series of sizes or ratings that the last key of a lookup runs through.</summary>
public class SeriesTests
{
    private static readonly TableSource Source = new("made", "Made for the test", ["our own invention"], "made.yaml");

    [Fact]
    public void A_series_has_the_numbers_that_lead_to_a_figure_ascending()
    {
        var lookup = Made(("gG", 6, 1), ("gG", 4, 2), ("gG", 2, 3), ("gG", 10, double.NaN), ("aM", 16, 4));

        Assert.Equal([2.0, 4.0, 6.0], lookup.Series([Value.Of("gG")]));
        Assert.Equal([16.0], lookup.Series([Value.Of("aM")]));
    }

    [Fact]
    public void A_series_of_what_is_not_tabulated_is_empty() => Assert.Empty(Made(("gG", 6, 1)).Series([Value.Of("gR")]));

    [Theory]
    [InlineData(32)]
    [InlineData(32 * (1 + 1e-12))]
    public void A_number_before_the_last_key_finds_its_series_even_where_it_was_computed(double rating)
    {
        var lookup = new Lookup("poles", "", [new LookupKey("rating", UnitCatalog.Find("A"), Between.None), new LookupKey("poles", Unit.One, Between.None)], null, "");
        lookup.Enter([32.0, 3.0], Cell(1));
        lookup.Enter([32.0, 1.0], Cell(1));
        lookup.Enter([40.0, 2.0], Cell(1));
        lookup.Close();

        Assert.Equal([1.0, 3.0], lookup.Series([Value.Of(rating)]));
        Assert.Empty(lookup.Series([Value.Of(33.0)]));
    }

    private static Lookup Made(params (string Kind, double Size, double Figure)[] cells)
    {
        var lookup = new Lookup("sizes", "", [new LookupKey("kind", null, Between.None), new LookupKey("size", Unit.One, Between.None)], Unit.One, "");
        foreach (var (kind, size, figure) in cells)
        {
            lookup.Enter([kind, size], Cell(figure));
        }

        lookup.Close();
        return lookup;
    }

    private static TableCell Cell(double figure) => new(Source, "", "", figure, null, Trust.OneSource, 1);
}
