using Auditor.Documents;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.RuleSets;

/// <summary>Takes the sentence of a rule apart into text and formulas.</summary>
internal sealed class SentenceReader(SubjectShape shape, FormulaWorld world, Problems problems)
{
    /// <summary>The sentence, or null with problems added.</summary>
    public Sentence? Read(ScalarNode source)
    {
        var parts = new List<Sentence.Part>();
        var text = source.Text;
        var at = 0;
        while (at < text.Length)
        {
            var open = text.IndexOf("{{", at, StringComparison.Ordinal);
            if (open < 0)
            {
                break;
            }

            var close = text.IndexOf("}}", open, StringComparison.Ordinal);
            if (close < 0)
            {
                problems.Add(RuleMessages.OpenBraces(source.SpanOf(open, 2)));
                return null;
            }

            parts.Add(new Sentence.Part(text[at..open], IsPlace: false, null));
            if (PartOf(source, open + 2, close) is not { } part)
            {
                return null;
            }

            parts.Add(part);
            at = close + 2;
        }

        parts.Add(new Sentence.Part(text[at..], IsPlace: false, null));
        return new Sentence([.. parts.Where(part => part.Text != "")]);
    }

    private Sentence.Part? PartOf(ScalarNode source, int start, int end)
    {
        var inner = source.Text[start..end];
        var lead = inner.Length - inner.TrimStart().Length;
        var text = inner.Trim();
        if (text is "value" or "limit")
        {
            return new Sentence.Part(text, IsPlace: true, null);
        }

        var formula = FormulaBinder.Bind(new ScalarNode(source.SpanOf(start + lead, text.Length), text, ScalarKind.Text), shape, world, null, problems);
        return formula is null ? null : new Sentence.Part(null, IsPlace: false, formula);
    }
}
