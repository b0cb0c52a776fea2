namespace Auditor.Documents;

/// <summary>
/// Leaves out of a huge document what its explanation can do without: explaining takes much more time and memory than looking. Of a long
/// list or mapping stay the parts that are not surely taken, up to so many as have more problems than are ever shown. A document with a
/// fault always keeps one.
/// </summary>
internal static class RefusedParts
{
    /// <summary>Twice as many as the problems that are kept of a file; every refused part has at least one.</summary>
    private const int Most = 2 * Problems.PerFile;

    /// <summary>The document to explain in place of another.</summary>
    /// <param name="node">The document or a part of it.</param>
    /// <param name="schema">What it is held against.</param>
    public static Node Of(Node node, QuickSchema schema)
    {
        if (schema.Reference is { } reference)
        {
            return Of(node, reference);
        }

        return node switch
        {
            _ when schema.IsUnsure || schema.OneOf.Count > 0 => node,
            SequenceNode sequence when schema.Items is { } items => Of(sequence, schema, items),
            MappingNode mapping when schema.PatternProperties.Count == 0 => Of(mapping, schema),
            _ => node,
        };
    }

    private static SequenceNode Of(SequenceNode sequence, QuickSchema schema, QuickSchema items)
    {
        var kept = Kept(sequence.Items, items.Look, _ => false, schema.Count.Take(sequence.Items.Count) && !schema.HasUniqueItems);
        return new SequenceNode(sequence.Span, [.. kept.Select(item => Of(item, items))]) { IsPartial = sequence.IsPartial };
    }

    private static MappingNode Of(MappingNode mapping, QuickSchema schema)
    {
        var kept = Kept(mapping.Entries, schema.Look, entry => schema.Properties.ContainsKey(entry.Key.Value), schema.Count.Take(mapping.Entries.Count));
        return new MappingNode(mapping.Span, [.. kept.Select(entry => entry with { Value = Of(entry, schema) })]) { IsPartial = mapping.IsPartial };
    }

    private static Node Of(MappingEntry entry, QuickSchema schema) =>
        (schema.Properties.GetValueOrDefault(entry.Key.Value) ?? schema.Others) is { } value ? Of(entry.Value, value) : entry.Value;

    /// <summary>The parts to keep, in their order.</summary>
    /// <param name="parts">All parts.</param>
    /// <param name="look">Looks at one.</param>
    /// <param name="isNamed">Whether a part is one that the schema names.</param>
    /// <param name="mayLack">Whether all is well with the whole, whichever parts there are.</param>
    private static IReadOnlyList<T> Kept<T>(IReadOnlyList<T> parts, Func<T, Acceptance> look, Func<T, bool> isNamed, bool mayLack)
    {
        if (parts.Count <= Most)
        {
            return parts;
        }

        var kept = new List<T>();
        var (taken, refused) = (0, 0);
        foreach (var part in parts)
        {
            var acceptance = look(part);
            refused += acceptance == Acceptance.No ? 1 : 0;
            taken += acceptance == Acceptance.Yes ? 1 : 0;
            if (isNamed(part) || (refused <= Most && (acceptance != Acceptance.Yes || !mayLack || taken <= Most)))
            {
                kept.Add(part);
            }
        }

        return kept;
    }
}
