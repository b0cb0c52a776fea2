using CsCheck;

namespace Auditor.Quantities.Tests;

public class DimensionLawTests
{
    [Fact]
    public void Multiplication_commutes() =>
        Gen.Select(Generators.Combinable, Generators.Combinable)
            .Sample((a, b) => a * b == b * a, iter: 2000);

    [Fact]
    public void Multiplication_associates() =>
        Gen.Select(Generators.Combinable, Generators.Combinable, Generators.Combinable)
            .Sample((a, b, c) => a * b * c == a * (b * c), iter: 2000);

    [Fact]
    public void Division_undoes_multiplication() =>
        Gen.Select(Generators.Combinable, Generators.Combinable)
            .Sample((a, b) => a * b / b == a && (a / a).IsNone, iter: 2000);

    [Fact]
    public void A_square_is_a_product_and_its_root_undoes_it() =>
        Generators.Combinable.Sample(a => a.TryPower(2, out Dimension square) && square == a * a && square.Sqrt() == a, iter: 2000);

    [Fact]
    public void A_power_of_a_product_is_the_product_of_powers() =>
        Gen.Select(Generators.Combinable, Generators.Combinable, Gen.Int[-4, 4]).Sample(
            (a, b, n) =>
            {
                Assert.True((a * b).TryPower(n, out Dimension whole));
                Assert.True(a.TryPower(n, out Dimension left));
                Assert.True(b.TryPower(n, out Dimension right));
                Assert.Equal(whole, left * right);
            },
            iter: 2000);

    [Fact]
    public void Powers_to_zero_and_one_are_trivial() =>
        Generators.Combinable.Sample(
            a => a.TryPower(0, out Dimension none) && none.IsNone && a.TryPower(1, out Dimension same) && same == a,
            iter: 2000);

    [Fact]
    public void What_subtracts_adds_back() =>
        Gen.Select(Generators.Any, Generators.Any).Sample(
            (a, b) =>
            {
                if (a.TryMinus(b, out Dimension difference))
                {
                    Assert.True(difference.TryPlus(b, out Dimension sum));
                    Assert.Equal(a, sum);
                }
            },
            iter: 2000);

    [Fact]
    public void The_text_of_a_dimension_is_the_unit_of_its_coherent_values() =>
        Generators.Combinable.Sample(
            a =>
            {
                Unit? unit = UnitCatalog.Find(a.ToString());
                Assert.NotNull(unit);
                Assert.Equal(a, unit.Dimension);
                Assert.Equal(1, unit.Scale);
            },
            iter: 2000);
}
