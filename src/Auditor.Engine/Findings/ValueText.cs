using System.Globalization;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Engine.Findings;

/// <summary>The one way in which values are shown to people.</summary>
public static class ValueText
{
    /// <summary>What stands for a value that is missing.</summary>
    public const string Unknown = "not known";

    private const int BoundDigits = 4;

    /// <summary>A value with its unit.</summary>
    public static string Show(in Value value, Unit? unit) => value.Kind switch
    {
        ValueKind.Missing => Unknown,
        ValueKind.Quantity => ShowNumber(value.Number, unit!),
        ValueKind.Flag => value.Flag ? "yes" : "no",
        ValueKind.Words => string.Join(", ", value.Words),
        _ => value.Text,
    };

    /// <summary>
    /// A relative margin, as a percentage with its sign and one decimal; so many more for one so small that it would show as zero. Zero,
    /// within the slack of comparisons, has no sign.
    /// </summary>
    public static string ShowMargin(double relative)
    {
        if (Math.Abs(relative) < Comparison.Slack)
        {
            return "0.0 %";
        }

        var percent = relative * 100;
        var decimals = Math.Abs(percent) < 0.05 ? -(int)Math.Floor(Math.Log10(Math.Abs(percent))) : 1;
        var shown = Math.Round(percent, decimals, MidpointRounding.AwayFromZero).ToString("0.0#########", CultureInfo.InvariantCulture);
        return $"{(relative > 0 ? "+" : "")}{shown} %";
    }

    /// <summary>A bound with its unit, rounded to four digits so that it stays on its safe side: an upper bound downward, a lower one upward.</summary>
    public static string ShowBound(double number, Unit unit, bool isMost)
    {
        var shown = unit.FromCoherent(number);
        if (shown == 0)
        {
            return ShowNumber(number, unit);
        }

        var scale = Math.Pow(10, BoundDigits - 1 - Math.Floor(Math.Log10(Math.Abs(shown))));
        var nearest = Math.Round(shown * scale);
        var isThere = Math.Abs((shown * scale) - nearest) <= Comparison.Slack * Math.Abs(nearest);
        var rounded = isThere ? nearest : isMost ? Math.Floor(shown * scale) : Math.Ceiling(shown * scale);
        return ShowNumber(unit.ToCoherent(rounded / scale), unit);
    }

    /// <summary>A number with its unit; a pure number stands alone.</summary>
    public static string ShowNumber(double number, Unit unit) =>
        unit.Equals(Unit.One) ? QuantityText.ShowNumber(number, unit) : QuantityText.Show(number, unit);
}
