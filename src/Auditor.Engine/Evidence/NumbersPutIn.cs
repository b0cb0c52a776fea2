using System.Text;
using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Formulas;

namespace Auditor.Engine.Evidence;

/// <summary>Writes a formula with its names replaced by their values.</summary>
internal static class NumbersPutIn
{
    public static string Write(Formula formula, IReadOnlyList<Tracer.Reading> readings)
    {
        var whole = formula.Source.Span;
        var text = new StringBuilder();
        var at = whole.Start;
        foreach (var reading in Outermost(readings, whole))
        {
            text.Append(whole.Source.Text, at, reading.Term.Start - at);
            text.Append(Shown(reading, IsBracketed(whole.Source.Text, reading.Term)));
            at = reading.Term.End;
        }

        text.Append(whole.Source.Text, at, whole.End - at);
        return OneLine(text.ToString());
    }

    /// <summary>A formula as written, on one line and without the marks that YAML puts around it.</summary>
    public static string OneLine(string text)
    {
        var words = text.Split([' ', '\t', '\r', '\n'], StringSplitOptions.RemoveEmptyEntries);
        return words is [">-" or ">" or "|" or "|-", .. var rest] ? string.Join(' ', rest) : string.Join(' ', words);
    }

    private static bool IsBracketed(string text, SourceSpan term) =>
        term.Start > 0 && text[term.Start - 1] == '(' && term.End < text.Length && text[term.End] == ')';

    private static string Shown(Tracer.Reading reading, bool isBracketed)
    {
        var shown = ValueText.Show(reading.Value, reading.Unit ?? Quantities.Unit.One);
        return shown.Contains(' ') && !isBracketed ? $"({shown})" : shown;
    }

    private static List<Tracer.Reading> Outermost(IReadOnlyList<Tracer.Reading> readings, SourceSpan whole)
    {
        var inside = readings.Where(reading => reading.Term.Source == whole.Source && reading.Term.Start >= whole.Start && reading.Term.End <= whole.End);
        var outermost = new List<Tracer.Reading>();
        foreach (var reading in inside.OrderBy(reading => reading.Term.Start).ThenByDescending(reading => reading.Term.End))
        {
            if (outermost.Count == 0 || reading.Term.Start >= outermost[^1].Term.End)
            {
                outermost.Add(reading);
            }
        }

        return outermost;
    }
}
