namespace Auditor.Documents;

/// <summary>
/// Writes the tree of a text as bytes, from which <see cref="NodeReader"/> makes it again without reading YAML. What stands in the
/// text is not repeated: each node has its place, counted from the place of the node around it, and only what cannot be read off there.
/// </summary>
/// <param name="output">Receives the bytes.</param>
public sealed class NodeWriter(BinaryWriter output)
{
    /// <summary>Writes a whole tree, read without loss.</summary>
    public void Write(Node root)
    {
        ArgumentNullException.ThrowIfNull(root);
        Write(root, 0);
    }

    private void Write(Node node, int around)
    {
        switch (node)
        {
            case MappingNode mapping:
                Head(NodeForm.Mapping, node.Span, around);
                output.Write7BitEncodedInt(mapping.Entries.Count);
                foreach (var entry in mapping.Entries)
                {
                    Text(entry.Key.Value, entry.Key.Span, node.Span.Start);
                    Write(entry.Value, node.Span.Start);
                }

                break;
            case SequenceNode sequence:
                Head(NodeForm.Sequence, node.Span, around);
                output.Write7BitEncodedInt(sequence.Items.Count);
                foreach (var item in sequence.Items)
                {
                    Write(item, node.Span.Start);
                }

                break;
            default:
                Write((ScalarNode)node, around);
                break;
        }
    }

    private void Write(ScalarNode scalar, int around)
    {
        if (scalar.Kind == ScalarKind.Text)
        {
            Text(scalar.Text, scalar.Span, around);
            return;
        }

        Head(scalar.Kind switch { ScalarKind.Number => NodeForm.Number, ScalarKind.Flag => NodeForm.Flag, _ => NodeForm.Null }, scalar.Span, around);
        output.Write(scalar.Text);
        if (scalar.Kind == ScalarKind.Number)
        {
            output.Write(scalar.Number);
        }
    }

    private void Text(string text, SourceSpan span, int around)
    {
        var isPlain = span.Source.Text.AsSpan(span.Start, span.Length).SequenceEqual(text);
        Head(isPlain ? NodeForm.PlainText : NodeForm.OtherText, span, around);
        if (!isPlain)
        {
            output.Write(text);
        }
    }

    private void Head(NodeForm form, SourceSpan span, int around)
    {
        output.Write((byte)form);
        output.Write7BitEncodedInt(span.Start - around);
        output.Write7BitEncodedInt(span.Length);
    }
}
