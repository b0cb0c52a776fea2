using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Findings;

/// <summary>Fills the sentence of a rule with the values of a finding.</summary>
internal static class SentenceWriter
{
    public static string Write(Finding finding)
    {
        var parts = finding.Rule.Says.Parts;
        var texts = new string[parts.Count + 1];
        for (var i = 0; i < parts.Count; i++)
        {
            texts[i] = Fill(parts[i], finding);
        }

        texts[^1] = finding.IsUnproven ? WithinTolerances(finding) : "";
        return string.Concat(texts);
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
