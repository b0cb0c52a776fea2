using System.Text;
using Auditor.Documents;
using Auditor.Engine.Adjustments;
using Auditor.Engine.Installation;

namespace Auditor.Engine.Remedies;

/// <summary>
/// Writes changed inputs into the text of a design, and nothing else: a value that the subject states itself is replaced; one that it
/// takes from a named type or from defaults, or lacks, is put in at the subject, so that no other subject changes.
/// </summary>
public static class DesignEdits
{
    /// <summary>The files that change, by path.</summary>
    /// <param name="design">The design.</param>
    /// <param name="changes">The changed inputs.</param>
    public static IReadOnlyList<EditedFile> Of(Design design, IReadOnlyList<ChangedInput> changes)
    {
        var edits = new List<(SourceText Source, TextEdit Edit)>();
        foreach (var group in changes.GroupBy(change => change.Input.Subject))
        {
            var entries = group.Select(change => (Keys(design, change), Text(design, change))).ToList();
            Enter(group.Key.Node, entries, edits);
        }

        return [.. edits.GroupBy(pair => pair.Source, pair => pair.Edit)
            .Select(file => new EditedFile(file.Key, Apply(file.Key.Text, file)))
            .OrderBy(file => file.Before.Path, StringComparer.Ordinal)];
    }

    private static IReadOnlyList<string> Keys(Design design, ChangedInput change) =>
        design.Evaluator.Rules.Schema.PlaceOf(change.Input.Subject.Shape, change.Input.Slot.Index)!.Keys;

    private static string Text(Design design, ChangedInput change) =>
        InputText.Of(change.After, change.Input.Slot, change.Input.Subject.Source(change.Input.Slot)?.Text ?? "");

    private static void Enter(MappingNode mapping, List<(IReadOnlyList<string> Keys, string Text)> entries, List<(SourceText Source, TextEdit Edit)> edits)
    {
        var added = new List<string>();
        foreach (var group in entries.GroupBy(entry => entry.Keys[0]))
        {
            switch (mapping.Find(group.Key))
            {
                case MappingNode inner:
                    Enter(inner, [.. group.Select(entry => ((IReadOnlyList<string>)[.. entry.Keys.Skip(1)], entry.Text))], edits);
                    break;
                case ScalarNode scalar:
                    edits.Add((scalar.Span.Source, new TextEdit(scalar.Span.Start, scalar.Span.Length, group.Single().Text)));
                    break;
                default:
                    added.Add($"{group.Key}: {Nested([.. group.Select(entry => ((IReadOnlyList<string>)[.. entry.Keys.Skip(1)], entry.Text))])}");
                    break;
            }
        }

        if (added.Count > 0)
        {
            edits.Add((mapping.Span.Source, EntryPlace.Insert(mapping, added)));
        }
    }

    private static string Nested(List<(IReadOnlyList<string> Keys, string Text)> entries) => entries is [([], var only)]
        ? only
        : $"{{ {string.Join(", ", entries.GroupBy(entry => entry.Keys[0]).Select(group => $"{group.Key}: {Nested([.. group.Select(entry => ((IReadOnlyList<string>)[.. entry.Keys.Skip(1)], entry.Text))])}"))} }}";

    private static string Apply(string text, IEnumerable<TextEdit> edits)
    {
        var written = new StringBuilder();
        var at = 0;
        foreach (var edit in edits.OrderBy(edit => edit.Start))
        {
            written.Append(text, at, edit.Start - at).Append(edit.Text);
            at = edit.Start + edit.Length;
        }

        return written.Append(text, at, text.Length - at).ToString();
    }
}
