using CsCheck;

namespace Auditor.Rules.Tests.Precise;

/// <summary>The arithmetic that formulas are worked out in again, against constants of mathematics and against its own inverses.</summary>
public class DoubleDoubleTests
{
    private const double Near = 1e-28;

    private static readonly Gen<double> Positive = Gen.Double[-12, 12].Select(power => Math.Pow(10, power));

    /// <summary>OEIS A002193, A001113 and A002392.</summary>
    [Theory]
    [InlineData("sqrt 2", "1.41421356237309504880168872420969807857")]
    [InlineData("exp 1", "2.71828182845904523536028747135266249776")]
    [InlineData("log 10", "2.30258509299404568401799145468436420760")]
    [InlineData("third", "0.33333333333333333333333333333333333333")]
    public void Constants_of_mathematics_come_out_to_twenty_eight_digits(string what, string digits)
    {
        var found = what switch
        {
            "sqrt 2" => ((DoubleDouble)2).Sqrt(),
            "exp 1" => ((DoubleDouble)1).Exp(),
            "log 10" => ((DoubleDouble)10).Log(),
            _ => (DoubleDouble)1 / 3,
        };
        Agree(Read(digits), found);
    }

    [Fact]
    public void Each_operation_is_undone_by_its_inverse() => Gen.Select(Positive, Positive).Sample((a, b) =>
    {
        DoubleDouble x = a;
        DoubleDouble y = b;
        Agree(x, x * y / y);
        Agree(x, x.Sqrt() * x.Sqrt());
        Agree(x, x.Log().Exp());
        Agree(x * x, x.Power(2));
        Agree(x, x.Power(0.37).Power((DoubleDouble)1 / 0.37));
        Agree(y, x + y - x, takenFrom: Math.Max(a, b));
    });

    /// <summary>With doubles these differences are nought.</summary>
    [Fact]
    public void What_a_double_drops_is_kept()
    {
        Assert.Equal(1e-25, ((DoubleDouble)1 + 1e-25 - 1).High);
        Assert.Equal(Math.ScaleB(1, -100), ((((DoubleDouble)1 + Math.ScaleB(1, -50)) * ((DoubleDouble)1 + Math.ScaleB(1, -50))) - 1 - Math.ScaleB(1, -49)).High);
    }

    private static DoubleDouble Read(string digits)
    {
        DoubleDouble value = 0;
        DoubleDouble scale = 1;
        foreach (var digit in digits.Where(char.IsAsciiDigit))
        {
            value = (value * 10) + (digit - '0');
            scale *= 10;
        }

        return value * 10 / scale;
    }

    private static void Agree(DoubleDouble expected, DoubleDouble found, double takenFrom = 0) =>
        Assert.InRange((expected - found).Abs().High, 0, Near * Math.Max(expected.Abs().High, takenFrom));
}
