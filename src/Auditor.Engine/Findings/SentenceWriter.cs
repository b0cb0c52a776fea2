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

        return text.ToString();
    }

    private static string Fill(Sentence.Part part, Finding finding)
    {
        if (part.Formula is { } formula)
        {
            return ValueText.Show(formula.Evaluate(finding.Subject.Scope), formula.Unit);
        }

        return (part.IsPlace, part.Text) switch
        {
            (true, "value") => ValueText.Show(finding.Judgement.Value, finding.Rule.Check.Unit),
            (true, _) => LimitText.Plain(finding.Rule.Check, finding.Judgement),
            _ => part.Text!,
        };
    }
}
