using CsCheck;

namespace Auditor.Quantities.Tests;

public class CompoundUnitTests
{
    [Theory]
    [InlineData("Ω·mm²/m", "Ω·mm²/m", 1e-6)]
    [InlineData("ohm*mm2/m", "Ω·mm²/m", 1e-6)]
    [InlineData("kW/h", "kW/h", 0.2777777777777778)]
    [InlineData("VA / m²", "VA/m²", 1)]
    [InlineData("%/m", "%/m", 0.01)]
    [InlineData("1/s", "1/s", 1)]
    [InlineData("1 / min", "1/min", 0.016666666666666666)]
    [InlineData("s⁻¹", "1/s", 1)]
    [InlineData("m^-2", "1/m²", 1)]
    [InlineData("m^\u22122", "1/m²", 1)]
    [InlineData("mV/mA", "mV/mA", 1)]
    [InlineData("m·m", "m²", 1)]
    [InlineData("mm·mm", "mm²", 1e-6)]
    [InlineData("A²·s", "A²s", 1)]
    [InlineData("A^2*s", "A²s", 1)]
    [InlineData("kA\u22C5kA·s", "kA²s", 1e6)]
    [InlineData("A·√s/mm²", "A·s^½/mm²", 1e6)]
    [InlineData("A*s^0.5/mm^2", "A·s^½/mm²", 1e6)]
    [InlineData("m^1.5", "m^1.5", 1)]
    [InlineData("Ω·m/m", "Ω", 1)]
    [InlineData("m/m", "1", 1)]
    [InlineData("K·m/kW", "K·m/kW", 0.001)]
    public void Compounds_of_units_are_units(string spelling, string symbol, double scale)
    {
        Unit? unit = UnitCatalog.Find(spelling);

        Assert.NotNull(unit);
        Assert.Equal(symbol, unit.Symbol);
        Assert.Equal(scale, unit.Scale, scale * 1e-15);
    }

    [Theory]
    [InlineData("ohm_mm2_per_m", "Ω·mm²/m")]
    [InlineData("percent_per_m", "%/m")]
    [InlineData("per_s", "1/s")]
    [InlineData("mV_per_A_m", "mV/A/m")]
    [InlineData("A_rt_s_per_mm2", "A·s^½/mm²")]
    [InlineData("rt_m3", "m^1.5")]
    [InlineData("A2_s", "A²s")]
    [InlineData("K_m_per_W", "K·m/W")]
    public void Compounds_are_identifiers_too(string identifier, string symbol)
    {
        Assert.Equal(symbol, UnitCatalog.FindIdentifier(identifier)?.Symbol);
        Assert.Equal(symbol, UnitCatalog.Find(identifier)?.Symbol);
    }

    [Theory]
    [InlineData("mm²")]
    [InlineData("%")]
    [InlineData("1/K")]
    [InlineData("")]
    [InlineData("2m")]
    [InlineData("m_")]
    [InlineData("_m")]
    [InlineData("per")]
    [InlineData("m_per")]
    [InlineData("rt")]
    [InlineData("rt_rt_s")]
    [InlineData("m_per_s_per_s")]
    [InlineData("rt_per_s")]
    [InlineData("m0")]
    [InlineData("m100")]
    [InlineData("degC_m")]
    [InlineData("x_per_m")]
    public void What_is_no_identifier_of_a_unit_is_not_found(string identifier) =>
        Assert.Null(UnitCatalog.FindIdentifier(identifier));

    [Theory]
    [InlineData("m/")]
    [InlineData("/")]
    [InlineData("·m")]
    [InlineData("m·")]
    [InlineData("m··s")]
    [InlineData("m^")]
    [InlineData("m^-")]
    [InlineData("m^x")]
    [InlineData("m^.5")]
    [InlineData("m^0")]
    [InlineData("m^0.25")]
    [InlineData("m^10.5")]
    [InlineData("m⁰")]
    [InlineData("m⁻")]
    [InlineData("√")]
    [InlineData("√s²")]
    [InlineData("1·m")]
    [InlineData("m/1")]
    [InlineData("m s")]
    [InlineData("°C/m")]
    [InlineData("W/°C")]
    [InlineData("A²s/m")]
    [InlineData("m^2^2")]
    public void What_is_no_compound_is_not_found(string spelling) =>
        Assert.Null(UnitCatalog.Find(spelling));

    [Fact]
    public void A_product_after_a_solidus_is_refused_because_readers_disagree_on_it() =>
        Assert.Null(UnitCatalog.Find("mV/A·m"));

    [Fact]
    public void Exponents_reach_to_nine_and_a_half()
    {
        Assert.NotNull(UnitCatalog.Find("m^9"));
        Assert.NotNull(UnitCatalog.Find("m^9.5"));
        Assert.Null(UnitCatalog.Find("m^10"));
        Assert.Null(UnitCatalog.Find("m⁹·m"));
    }

    [Fact]
    public void A_compound_has_at_most_eight_factors()
    {
        Assert.NotNull(UnitCatalog.Find("V·A·m·s·K·W·J·Hz"));
        Assert.Null(UnitCatalog.Find("V·A·m·s·K·W·J·Hz·kV"));
    }

    [Fact]
    public void A_compound_of_more_than_128_characters_is_not_read()
    {
        Assert.NotNull(UnitCatalog.Find(new string(' ', 124) + "Ω·mm"));
        Assert.Null(UnitCatalog.Find(new string(' ', 125) + "Ω·mm"));
    }

    [Fact]
    public void A_scale_beyond_the_range_of_numbers_is_no_unit() =>
        Assert.Null(UnitCatalog.Find("MΩ^9·MW^9·MVA^9·kWh^9·kV^9·kA^9·km^9·h^9"));

    [Fact]
    public void Equal_compounds_are_equal_units()
    {
        Assert.Equal(UnitCatalog.Find("kW/h"), UnitCatalog.Find("kW / h"));
        Assert.Equal(UnitCatalog.Find("kW/h")!.GetHashCode(), UnitCatalog.Find("kW / h")!.GetHashCode());
        Assert.NotEqual(UnitCatalog.Find("kW/h"), UnitCatalog.Find("kW/s"));
        Assert.NotEqual(UnitCatalog.Find("Ω/km"), UnitCatalog.Find("mΩ/m"));
    }

    [Fact]
    public void Symbol_and_identifier_of_every_compound_find_it_again() =>
        Generators.CompoundSpelling.Sample(
            spelling =>
            {
                Unit? unit = UnitCatalog.Find(spelling);
                Assert.NotNull(unit);
                Assert.Equal(unit, UnitCatalog.Find(unit.Symbol));
                Assert.Equal(unit, UnitCatalog.FindIdentifier(unit.Identifier));
                Assert.All(unit.Spellings, own => Assert.Equal(unit, UnitCatalog.Find(own)));
            },
            iter: 20_000);

    [Fact]
    public void The_dimension_of_a_product_of_units_is_the_product_of_their_dimensions() =>
        Gen.Select(Gen.OneOf("V", "kA", "mm", "h", "K"), Gen.OneOf("W", "min", "Ω", "Hz"))
            .Sample(
                (left, right) =>
                {
                    Unit product = UnitCatalog.Find($"{left}·{right}")!;
                    Unit quotient = UnitCatalog.Find($"{left}/{right}")!;
                    Unit a = UnitCatalog.Find(left)!;
                    Unit b = UnitCatalog.Find(right)!;
                    Assert.Equal(a.Dimension * b.Dimension, product.Dimension);
                    Assert.Equal(a.Dimension / b.Dimension, quotient.Dimension);
                    Assert.Equal(a.Scale * b.Scale, product.Scale, product.Scale * 1e-15);
                    Assert.Equal(a.Scale / b.Scale, quotient.Scale, quotient.Scale * 1e-15);
                },
                iter: 500);

    [Fact]
    public void No_text_makes_the_search_throw() =>
        Gen.OneOf(Gen.String, Gen.OneOf("m", "A", "/", "·", "^", "-", "½", "²", "⁻", "√", "1", "_", "per", "rt", " ", "9")
            .Array[0, 12].Select(string.Concat)).Sample(
                text =>
                {
                    Unit? unit = UnitCatalog.Find(text);
                    Assert.True(unit is null || double.IsNormal(unit.Scale));
                    _ = UnitCatalog.FindIdentifier(text);
                },
                iter: 50_000);
}
