using Auditor.Quantities;

namespace Auditor.Documents.Tests;

public class QuantityKindTests
{
    public static TheoryData<string> Names => [.. QuantityKind.All.Select(kind => kind.Name)];

    [Theory]
    [MemberData(nameof(Names))]
    public void The_example_of_a_kind_is_one_of_it(string name)
    {
        var kind = QuantityKind.Find(name)!;

        Assert.True(QuantityText.TryParse(kind.Example, out var stated, out _));
        Assert.True(kind.Accepts(stated.Unit));
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void The_units_that_a_kind_names_are_accepted(string name)
    {
        var kind = QuantityKind.Find(name)!;

        Assert.NotEmpty(kind.AcceptedUnits);
        Assert.All(kind.AcceptedUnits, symbol => Assert.True(kind.Accepts(UnitCatalog.Find(symbol)!)));
    }

    [Fact]
    public void Names_are_unique() => Assert.Distinct(QuantityKind.All.Select(kind => kind.Name));

    [Fact]
    public void An_unknown_kind_is_not_found() => Assert.Null(QuantityKind.Find("colour"));

    [Theory]
    [InlineData("power", "kVA")]
    [InlineData("power", "kvar")]
    [InlineData("apparent-power", "kW")]
    [InlineData("temperature", "K")]
    [InlineData("temperature-difference", "°C")]
    [InlineData("ratio", "A")]
    public void A_unit_of_another_meaning_is_not_accepted(string name, string unit)
        => Assert.False(QuantityKind.Find(name)!.Accepts(UnitCatalog.Find(unit)!));
}
