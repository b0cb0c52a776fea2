using System.Text;

namespace Auditor.Quantities;

/// <summary>The wording of every fault of a quantity text.</summary>
internal static class QuantityFaults
{
    private const int LongestQuote = 40;
    private const string Example = "write a number and its unit, for example `25 m`";

    internal static QuantityFault Empty(int start) => new(start, 0, "nothing stands where a quantity is due", Example);

    internal static QuantityFault NumberMissing(int start, ReadOnlySpan<char> found) =>
        new(start, found.Length, $"a quantity begins with a number, not with {Quote(found)}", Example);

    internal static QuantityFault NotFinite(int start, ReadOnlySpan<char> found) =>
        new(start, found.Length, $"{Quote(found)} is not a finite number", "leave out what is not known; write a number where it is");

    internal static QuantityFault CommaInNumber(int start, int length) =>
        new(start, length, "a comma stands inside the number", "write a decimal point, `2.5`, and nothing between thousands, `1000`");

    internal static QuantityFault SecondNumber(int start, ReadOnlySpan<char> found) =>
        new(
            start,
            found.Length,
            $"a number is followed by a second one, {Quote(found)}",
            "write one number, with nothing between thousands, and then its unit");

    internal static QuantityFault TooLarge(int start, int length) =>
        new(
            start,
            length,
            "the number is beyond any sense: above 1e15, as written or in base units",
            "check the number of digits, the exponent and the unit");

    internal static QuantityFault TooSmall(int start, int length) =>
        new(
            start,
            length,
            "the number is beyond any sense: below 1e-15 but not zero, as written or in base units",
            "check the exponent and the unit, or write 0");

    internal static QuantityFault BelowAbsoluteZero(int start, int length) =>
        new(start, length, "the temperature lies below absolute zero, -273.15 °C", "check the number and its sign");

    internal static QuantityFault UnitUnknown(int start, ReadOnlySpan<char> found, IReadOnlyList<Unit> likely)
    {
        string help = likely.Count > 0
            ? $"did you mean {string.Join(" or ", likely.Select(unit => $"`{unit}`"))}? Capital and small letters differ in meaning"
            : "write a unit such as `mm²`, `Ω`, `kA` or `°C`, or a combination such as `mΩ/m`";
        return new(start, found.Length, $"{Quote(found)} is not a unit", help);
    }

    internal static QuantityFault ToleranceNumberMissing(int start, ReadOnlySpan<char> found) =>
        new(
            start,
            found.Length,
            "the tolerance lacks its number",
            "write for example `± 10 %`, `± 2 m` or `+3 m -1 m`; the sign stands before the number and nowhere else");

    internal static QuantityFault ValueUnitMissing(int start, int length, Unit unit) =>
        new(
            start,
            length,
            $"the tolerance is in `{unit}`, the value has no unit",
            $"write the unit after both numbers, for example `18 {unit} ± 2 {unit}`, also where you mean a range");

    internal static QuantityFault ToleranceUnitMissing(int start, Unit unit) =>
        new(start, 0, "the tolerance lacks its unit", $"write it in per cent, `%`, or in {ToleranceUnit(unit)}");

    internal static QuantityFault ToleranceUnitUnfit(int start, int length, Unit tolerance, Unit unit) =>
        new(
            start,
            length,
            $"a tolerance in `{tolerance}` does not fit a value in `{unit}`",
            $"write it in per cent, `%`, or in {ToleranceUnit(unit)}");

    internal static QuantityFault ToleranceOfTemperature(int start, int length, Unit tolerance) =>
        new(
            start,
            length,
            $"a tolerance in `{tolerance}` does not fit a temperature, whose zero is arbitrary",
            "write it in kelvins, for example `± 5 K`");

    internal static QuantityFault ToleranceSideMissing(int start, char other) =>
        new(
            start,
            0,
            $"the tolerance has one side only: the one with `{other}` is missing",
            "write both, for example `+3 m -0 m`, or one for both, `± 3 m`");

    internal static QuantityFault ToleranceUnitsDiffer(int start, int length, Unit first, Unit second) =>
        new(start, length, $"the sides of the tolerance are in different units, `{first}` and `{second}`", $"write both in `{first}`");

    internal static QuantityFault StandingMissing(int start) =>
        new(start, 0, "no word follows the comma", StandingHelp);

    internal static QuantityFault StandingUnknown(int start, ReadOnlySpan<char> found) =>
        new(start, found.Length, $"{Quote(found)} does not say how the value is known", StandingHelp);

    internal static QuantityFault Surplus(int start, ReadOnlySpan<char> found) =>
        new(
            start,
            found.Length,
            $"{Quote(found)} follows a quantity that is complete",
            "write one number with its unit, at most one tolerance, and at most one word after a comma");

    private static string StandingHelp =>
        "write `assumed`, `declared` or `measured`, in small letters, or end before the comma for a designed value";

    private static string ToleranceUnit(Unit unit) =>
        unit.Equals(UnitDefinitions.Percent) || unit.Equals(Unit.One) ? "plain numbers" : $"`{unit}`";

    /// <summary>The text in quotation marks, cut where it is long, with � for control characters.</summary>
    private static string Quote(ReadOnlySpan<char> text)
    {
        var quote = new StringBuilder("`");
        int length = 0;
        foreach (Rune rune in text.EnumerateRunes())
        {
            if (++length > LongestQuote)
            {
                quote.Append('…');
                break;
            }

            quote.Append(Rune.IsControl(rune) ? Rune.ReplacementChar.ToString() : rune.ToString());
        }

        return quote.Append('`').ToString();
    }
}
