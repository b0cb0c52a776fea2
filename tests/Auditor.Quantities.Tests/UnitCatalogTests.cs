namespace Auditor.Quantities.Tests;

public class UnitCatalogTests
{
    public static TheoryData<string> Symbols => [.. UnitCatalog.All.Select(unit => unit.Symbol)];

    [Theory]
    [MemberData(nameof(Symbols))]
    public void Every_spelling_finds_its_unit(string symbol)
    {
        Unit unit = UnitCatalog.All.Single(known => known.Symbol == symbol);

        Assert.All(unit.Spellings, spelling => Assert.Same(unit, UnitCatalog.Find(spelling)));
        Assert.Contains(unit.Symbol, unit.Spellings);
        Assert.Contains(unit.Identifier, unit.Spellings);
    }

    [Theory]
    [MemberData(nameof(Symbols))]
    public void Every_identifier_is_one_and_finds_its_unit(string symbol)
    {
        Unit unit = UnitCatalog.Find(symbol)!;

        Assert.Matches("^[A-Za-z_][A-Za-z0-9_]*$", unit.Identifier);
        Assert.Same(unit, UnitCatalog.FindIdentifier(unit.Identifier));
    }

    [Fact]
    public void No_spelling_is_shared()
    {
        string[] spellings = [.. UnitCatalog.All.SelectMany(unit => unit.Spellings)];

        Assert.Equal(spellings.Length, spellings.Distinct().Count());
    }

    [Fact]
    public void The_units_of_a_dimension_come_coherent_first()
    {
        Assert.Equal(["m", "km", "mm", "cm"], UnitCatalog.Of(Dimension.Length).Select(unit => unit.Symbol));
        Assert.Equal(["1", "%"], UnitCatalog.Of(Dimension.None).Select(unit => unit.Symbol));
        Assert.Equal(["°C"], UnitCatalog.Of(Dimension.Temperature).Select(unit => unit.Symbol));
        Assert.Equal(["K"], UnitCatalog.Of(Dimension.TemperatureDifference).Select(unit => unit.Symbol));
        Assert.All(
            UnitCatalog.All.GroupBy(unit => unit.Dimension).Where(group => group.Key != Dimension.AdiabaticFactor),
            group => Assert.Equal(1, group.First().Scale));
    }

    [Fact]
    public void A_dimension_without_catalogued_units_has_none() =>
        Assert.Empty(UnitCatalog.Of(Dimension.Of(1, 0, 0, 1, 0)));

    [Fact]
    public void Capital_and_small_letters_differ()
    {
        Assert.Equal(Dimension.Length, UnitCatalog.Find("m")!.Dimension);
        Assert.Null(UnitCatalog.Find("M"));
        Assert.Null(UnitCatalog.Find("KV"));
        Assert.Equal(0.001, UnitCatalog.Find("mohm")!.Scale);
        Assert.Equal(1e6, UnitCatalog.Find("Mohm")!.Scale);
    }

    [Fact]
    public void A_metre_is_not_a_minute()
    {
        Assert.Equal(Dimension.Length, UnitCatalog.Find("m")!.Dimension);
        Assert.Equal(60, UnitCatalog.Find("min")!.Scale);
    }

    [Fact]
    public void The_ohm_sign_and_the_omega_are_the_same_unit()
    {
        Assert.Same(UnitCatalog.Find("\u03A9"), UnitCatalog.Find("\u2126"));
        Assert.Same(UnitCatalog.Find("M\u03A9"), UnitCatalog.Find("M\u2126"));
        Assert.Same(UnitCatalog.Find("m\u03A9/m"), UnitCatalog.Find("m\u2126/m"));
    }

    [Theory]
    [InlineData("")]
    [InlineData(" ")]
    [InlineData("x")]
    [InlineData("\0")]
    [InlineData("°F")]
    public void What_is_no_unit_is_not_found(string spelling) =>
        Assert.Null(UnitCatalog.Find(spelling));

    [Fact]
    public void A_thirty_milliampere_device_operates_at_exactly_three_hundredths_of_an_ampere() =>
        Assert.Equal(0.03, UnitCatalog.Find("mA")!.ToCoherent(30));

    [Fact]
    public void The_number_in_a_unit_is_the_number_that_was_converted() =>
        Assert.Equal(2.5, UnitCatalog.Find("mm²")!.FromCoherent(2.5e-6));

    [Fact]
    public void A_pure_number_has_the_unit_one()
    {
        Assert.Same(Unit.One, UnitCatalog.Find("1"));
        Assert.Equal("1", Unit.One.Symbol);
        Assert.True(Unit.One.Dimension.IsNone);
    }
}
