using Auditor.Documents;

namespace Auditor.Engine.Installation;

/// <summary>The inputs of one kind of subject as a tree of keys, so that one walk over a mapping finds all that it gives.</summary>
internal sealed class InputTree
{
    private readonly Dictionary<string, InputTree> _below = new(StringComparer.Ordinal);

    private int? _slot;

    /// <summary>Entry of <c>types</c> that a <c>type</c> in this mapping names an entry of; null where none does.</summary>
    private string? _types;

    /// <summary>Makes the tree.</summary>
    /// <param name="places">Where each input stands, by slot number; null for those that the tree of subjects itself answers.</param>
    public static InputTree Of(IReadOnlyList<InputPlace?> places)
    {
        var root = new InputTree();
        for (var slot = 0; slot < places.Count; slot++)
        {
            if (places[slot] is { } place)
            {
                root.At(place.Keys, place.Keys.Count)._slot = slot;
                if (place.Types is not null)
                {
                    root.At(place.Keys, place.NamedAt)._types = place.Types;
                }
            }
        }

        return root;
    }

    /// <summary>Takes what a mapping itself says.</summary>
    public void Own(MappingNode mapping, InputGathering inputs)
    {
        foreach (var entry in mapping.Entries)
        {
            Take(entry, inputs, isNamed: false);
        }
    }

    /// <summary>Takes what the named types say to which a mapping, or one within it, refers.</summary>
    /// <param name="mapping">The mapping.</param>
    /// <param name="types">The <c>types</c> of the design.</param>
    /// <param name="inputs">Receives it.</param>
    public void Named(MappingNode mapping, MappingNode types, InputGathering inputs)
    {
        if (_types is not null && mapping.Text("type") is { } name && types.Mapping(_types)?.Mapping(name) is { } type)
        {
            foreach (var entry in type.Entries)
            {
                Take(entry, inputs, isNamed: true);
            }
        }

        foreach (var entry in mapping.Entries)
        {
            if (entry.Value is MappingNode inner && _below.TryGetValue(entry.Key.Value, out var tree))
            {
                tree.Named(inner, types, inputs);
            }
        }
    }

    /// <summary>Takes an entry and what is within it. A named type says nothing of a mapping that has named types of its own.</summary>
    private void Take(MappingEntry entry, InputGathering inputs, bool isNamed)
    {
        if (!_below.TryGetValue(entry.Key.Value, out var tree))
        {
            return;
        }

        if (tree._slot is { } slot)
        {
            inputs.Add(slot, entry.Value);
        }

        if (entry.Value is MappingNode inner && !(isNamed && tree._types is not null))
        {
            foreach (var each in inner.Entries)
            {
                tree.Take(each, inputs, isNamed);
            }
        }
    }

    private InputTree At(IReadOnlyList<string> keys, int depth)
    {
        var tree = this;
        for (var i = 0; i < depth; i++)
        {
            if (!tree._below.TryGetValue(keys[i], out var next))
            {
                tree._below.Add(keys[i], next = new InputTree());
            }

            tree = next;
        }

        return tree;
    }
}
