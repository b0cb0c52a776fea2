using System.Text;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Findings;

/// <summary>Fills the sentence of a rule with the values of a finding.</summary>
internal static class SentenceWriter
{
    public static string Write(Finding finding)
    {
        var text = new StringBuilder();
        foreach (var part in finding.Rule.Says.Parts)
        {
            text.Append(Fill(part, finding));
        }

        return finding.IsUnproven ? text.Append(WithinTolerances(finding)).ToString() : text.ToString();
    }

    private static string WithinTolerances(Finding finding)
    {
        var margin = finding.WorstCase!.Margin?.Relative is { } relative ? $", margin {ValueText.ShowMargin(relative)}" : "";
        return finding.WorstCase.Judgement.Verdict == Verdict.Undetermined
            ? " So as stated; it cannot be judged everywhere within the tolerances."
            : $" {(finding.AppliesAsStated ? "So as stated" : "So in the worst case, and only within the tolerances")}; not kept everywhere within the tolerances{margin}.";
    }

    private static string Fill(Sentence.Part part, Finding finding)
    {
        if (part.Formula is { } formula)
        {
            return ValueText.Show(formula.Evaluate(finding.Scope), formula.Unit);
        }

        return (part.IsPlace, part.Text) switch
        {
            (true, "value") => ValueText.Show(finding.Judgement.Value, finding.Rule.Check.Unit),
            (true, _) => LimitText.Plain(finding.Rule.Check, finding.Judgement),
            _ => part.Text!,
        };
    }
}
