using Auditor.Documents;

namespace Auditor.Engine.Remedies;

/// <summary>Finds where in a text new entries of a mapping go: after its last entry, in the style of the mapping.</summary>
internal static class EntryPlace
{
    /// <summary>The edit that adds entries.</summary>
    /// <param name="mapping">A mapping with at least one entry of its own file.</param>
    /// <param name="entries">The entries as text.</param>
    public static TextEdit Insert(MappingNode mapping, IReadOnlyList<string> entries)
    {
        var (source, text) = (mapping.Span.Source, mapping.Span.Source.Text);
        var own = mapping.Entries.Where(entry => entry.Key.Span.Source == source).ToArray();
        if (text[mapping.Span.Start] == '{')
        {
            return new TextEdit(Math.Max(EndOf(own[^1]), mapping.Span.Start + 1), 0, $", {string.Join(", ", entries)}");
        }

        var indent = new string(' ', own[0].Key.Span.StartLocation.Column - 1);
        var ending = text.Contains("\r\n", StringComparison.Ordinal) ? "\r\n" : "\n";
        var end = EndOf(own[^1]);
        var isAtLineStart = end > 0 && text[end - 1] == '\n';
        var lineEnd = isAtLineStart ? end : text.IndexOf('\n', end) + 1;
        var lines = string.Concat(entries.Select(entry => $"{indent}{entry}{ending}"));
        return lineEnd > 0 ? new TextEdit(lineEnd, 0, lines) : new TextEdit(text.Length, 0, ending + lines[..^ending.Length]);
    }

    private static int EndOf(MappingEntry entry) => entry.Value.Span.Source == entry.Key.Span.Source
        ? Math.Max(entry.Key.Span.End, entry.Value.Span.End)
        : entry.Key.Span.End;
}
