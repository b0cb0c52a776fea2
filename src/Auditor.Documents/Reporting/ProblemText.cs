using System.Text;

namespace Auditor.Documents;

/// <summary>Writes problems for people: place, line of text, mark under it, help. Plain text without colour; lines end with LF.</summary>
public static class ProblemText
{
    private const int LongestQuote = 60;

    /// <summary>Writes problems in the order given, with an empty line between two.</summary>
    public static string Render(IEnumerable<Problem> problems) => string.Join('\n', problems.Select(Render));

    /// <summary>
    /// Puts a text from a file between backquotes for use in a message: cut at 60 characters, with � for what cannot be shown.
    /// </summary>
    public static string Quote(string text)
    {
        var shown = ShownText.Of(text.AsSpan(0, Math.Min(text.Length, 4 * LongestQuote)));
        return shown.Width <= LongestQuote && text.Length <= 4 * LongestQuote ? $"`{shown}`" : $"`{shown.Cut(0, LongestQuote - 1)}…`";
    }

    private static string Render(Problem problem)
    {
        var text = new StringBuilder();
        var severity = problem.Severity == Severity.Error ? "error" : "warning";
        var place = problem.Span is { } at ? $"{PlaceOf(at)}: " : "";
        text.Append(place).Append(severity).Append(' ').Append(problem.Code).Append(": ").Append(problem.Message).Append('\n');
        var margin = MarginOf(problem);
        if (problem.Span is { } span)
        {
            SourceExcerpt.Append(text, span, margin);
        }

        foreach (var label in problem.Labels)
        {
            text.Append(' ', margin + 1).Append(PlaceOf(label.Span)).Append(": ").Append(label.Text).Append('\n');
            SourceExcerpt.Append(text, label.Span, margin);
        }

        if (problem.Help is { } help)
        {
            text.Append(' ', margin + 1).Append("= ").Append(help).Append('\n');
        }

        return text.ToString();
    }

    /// <summary>How wide the column of line numbers must be for all excerpts of a problem.</summary>
    private static int MarginOf(Problem problem)
    {
        var spans = problem.Labels.Select(label => label.Span);
        var last = (problem.Span is { } span ? spans.Append(span) : spans).Select(each => each.StartLocation.Line).DefaultIfEmpty().Max();
        return Math.Max(5, last.ToString().Length);
    }

    private static string PlaceOf(SourceSpan span) => span.Source.Text.Length == 0 ? span.Source.Path : span.ToString();
}
