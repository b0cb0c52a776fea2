using System.Text.RegularExpressions;

namespace Auditor.Reports.Tests.Pictures;

/// <summary>
/// Points of the time-current chart of the one circuit lie where a hand calculation puts them: the axes run from 10 A to 10000 A over 440 units
/// from 60, and from 0.01 s to 10000 s over 360 units down to 406.
/// </summary>
public partial class TimeCurrentAxisTests
{
    // 60 + 440/3 x log10(259.7/10) and so on, by hand; the curve of a 20 A type B breaker has opened at five times 20 A in 0.1 s.
    [Theory]
    [InlineData("p-line p-s4 p-dash", 267.4, 406.0)]
    [InlineData("p-line p-s4 p-close", 383.3, 46.0)]
    [InlineData("p-limit", 60.0, 309.9)]
    [InlineData("p-line p-s1", 206.7, 346.0)]
    [InlineData("p-line p-s3 p-chain", 222.7, 244.1)]
    public void A_point_lies_where_it_belongs(string look, double x, double y)
    {
        var chart = Gallery.Xml(Gallery.Of("one-circuit/one-circuit.design.yaml").Of("time-current").Single());
        var path = chart.Descendants().First(element => element.Attribute("class")?.Value == look && element.Parent!.Attribute("clip-path") is not null);

        Assert.Contains(Points(path.Attribute("d")!.Value), point => Math.Abs(point.X - x) < 0.15 && Math.Abs(point.Y - y) < 0.15);
    }

    private static IEnumerable<(double X, double Y)> Points(string data)
    {
        var (x, y) = (0d, 0d);
        foreach (Match step in Step().Matches(data))
        {
            var numbers = step.Groups["to"].Value.Split(' ').Select(double.Parse).ToArray();
            (x, y) = step.Groups["way"].Value switch { "H" => (numbers[0], y), "V" => (x, numbers[0]), _ => (numbers[0], numbers[1]) };
            yield return (x, y);
        }
    }

    [GeneratedRegex("(?<way>[MLHV])(?<to>[-0-9. ]+)", RegexOptions.None, 1000)]
    private static partial Regex Step();
}
