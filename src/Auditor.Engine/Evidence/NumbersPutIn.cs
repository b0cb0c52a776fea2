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
        var source = formula.Source;
        var places = Enumerable.Range(0, source.Text.Length + 1).Select(source.OffsetOf).ToList();
        var text = new StringBuilder();
        var at = 0;
        foreach (var reading in Outermost(readings, source.Span))
        {
            var start = IndexOf(places, reading.Term.Start);
            var end = IndexOf(places, reading.Term.End);
            text.Append(source.Text, at, start - at);
            text.Append(Shown(reading, IsBracketed(source.Text, start, end)));
            at = end;
        }

        return OneLine(text.Append(source.Text, at, source.Text.Length - at).ToString());
    }

    /// <summary>A formula on one line.</summary>
    public static string OneLine(string text) => string.Join(' ', text.Split([' ', '\t', '\r', '\n'], StringSplitOptions.RemoveEmptyEntries));

    /// <summary>The index in the formula of the first character that stands at or after an offset of the file.</summary>
    private static int IndexOf(List<int> places, int offset) => places.FindIndex(place => place >= offset) is >= 0 and var index ? index : places.Count - 1;

    private static bool IsBracketed(string text, int start, int end) => start > 0 && text[start - 1] == '(' && end < text.Length && text[end] == ')';

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
