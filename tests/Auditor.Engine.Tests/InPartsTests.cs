using System.Globalization;
using Auditor.Engine.Evaluation;

namespace Auditor.Engine.Tests;

/// <summary>Long jobs done side by side.</summary>
public class InPartsTests
{
    [Theory]
    [InlineData(0, "")]
    [InlineData(1, "0..1")]
    [InlineData(3, "0..3")]
    [InlineData(4, "0..3 3..4")]
    [InlineData(9, "0..3 3..6 6..9")]
    [InlineData(10, "0..3 3..6 6..9 9..10")]
    public void Parts_come_in_order_and_take_each_thing_once(int count, string parts) =>
        Assert.Equal(parts, string.Join(' ', InParts.Make(count, 3, range => range.ToString())));

    [Fact]
    public void Thousands_of_parts_leave_nothing_out()
    {
        var made = InParts.Make(10_000, 7, range => Enumerable.Range(range.Start.Value, range.End.Value - range.Start.Value));

        Assert.Equal(Enumerable.Range(0, 10_000), made.SelectMany(part => part));
    }

    [Theory]
    [InlineData(2)]
    [InlineData(50)]
    public void What_goes_wrong_in_a_part_goes_wrong_for_the_caller(int count)
    {
        var thrown = Assert.Throws<FormatException>(() => InParts.Make(count, 2, range => int.Parse("none", CultureInfo.InvariantCulture)));

        Assert.Contains("none", thrown.Message, StringComparison.Ordinal);
    }
}
