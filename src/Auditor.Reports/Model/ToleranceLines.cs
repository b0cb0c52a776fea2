using System.Globalization;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;

namespace Auditor.Reports.Model;

/// <summary>Says in words what tolerances make of a finding.</summary>
internal static class ToleranceLines
{
    /// <summary>Effects smaller than this share of the greatest one are left out: the reader is to see what matters.</summary>
    private const double Negligible = 0.01;

    public static IReadOnlyList<string> Of(Finding finding)
    {
        if (finding.WorstCase is not { } worst)
        {
            return [];
        }

        var greatest = worst.Effects.Select(effect => effect.Loss ?? 0).DefaultIfEmpty().Max();
        var lines = new List<string> { Verdict(worst) };
        lines.AddRange(worst.Effects.Where(effect => effect.Loss is not { } loss || loss >= Negligible * greatest).Select(Effect));
        if (finding.Share is { } share)
        {
            lines.Add($"kept in {Percent(share.Share)} of {share.Samples} random designs within the tolerances, standard error {Percent(share.StandardError)}");
        }

        return lines;
    }

    private static string Verdict(WorstCase worst)
    {
        var margin = worst.Margin?.Relative is { } relative ? $", margin {ValueText.ShowMargin(relative)}" : "";
        var how = worst.WasSearched ? "; found by search, since the margin does not follow one direction" : "";
        return $"worst case {worst.Judgement.Verdict?.Word() ?? "outside the rule"}{margin}{how}";
    }

    private static string Effect(InputEffect effect)
    {
        var (input, kind) = (effect.Input.Input, effect.Input.Kind == ToleranceKind.Instrument ? " with the uncertainty of its instrument" : "");
        var text = input.Subject.Source(input.Slot)?.Text ?? "";
        var cost = effect.Loss is { } loss ? $"costs up to {Percent(loss)}" : "decides it";
        var name = input.Subject.Parent is null ? input.Slot.Path : input.ToString();
        return $"{name}, {text}{kind}: {cost}";
    }

    private static string Percent(double share) => $"{Math.Round(share * 100, 1, MidpointRounding.AwayFromZero).ToString("0.0", CultureInfo.InvariantCulture)} %";
}
