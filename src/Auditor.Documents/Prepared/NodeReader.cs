using System.Buffers.Binary;
using System.Text;

namespace Auditor.Documents;

/// <summary>Makes the tree of a text from the bytes of <see cref="NodeWriter"/>.</summary>
/// <param name="source">The very text that the tree was made of.</param>
/// <param name="bytes">The bytes, whole and unchanged.</param>
public sealed class NodeReader(SourceText source, ReadOnlyMemory<byte> bytes)
{
    private readonly Dictionary<string, string>.AlternateLookup<ReadOnlySpan<char>> _keys =
        new Dictionary<string, string>(StringComparer.Ordinal).GetAlternateLookup<ReadOnlySpan<char>>();

    private int _at;

    /// <summary>Reads the tree.</summary>
    public Node Read() => Read(0);

    private Node Read(int around)
    {
        var form = (NodeForm)Byte();
        var span = Span(around);
        switch (form)
        {
            case NodeForm.Mapping:
                var entries = new MappingEntry[Int()];
                for (var i = 0; i < entries.Length; i++)
                {
                    entries[i] = new MappingEntry(Key(span.Start), Read(span.Start));
                }

                return new MappingNode(span, entries);
            case NodeForm.Sequence:
                var items = new Node[Int()];
                for (var i = 0; i < items.Length; i++)
                {
                    items[i] = Read(span.Start);
                }

                return new SequenceNode(span, items);
            case NodeForm.PlainText:
                return new ScalarNode(span);
            case NodeForm.OtherText:
                return new ScalarNode(span, Text(), ScalarKind.Text);
            case NodeForm.Number:
                return new ScalarNode(span, Text(), ScalarKind.Number, Double());
            default:
                return new ScalarNode(span, Text(), form == NodeForm.Flag ? ScalarKind.Flag : ScalarKind.Null);
        }
    }

    /// <summary>Reads a key; equal keys are one text.</summary>
    private Located<string> Key(int around)
    {
        var form = (NodeForm)Byte();
        var span = Span(around);
        if (form == NodeForm.OtherText)
        {
            return new Located<string>(Text(), span);
        }

        var written = source.Text.AsSpan(span.Start, span.Length);
        if (!_keys.TryGetValue(written, out var key))
        {
            key = written.ToString();
            _keys[written] = key;
        }

        return new Located<string>(key, span);
    }

    private SourceSpan Span(int around)
    {
        var start = around + Int();
        return new SourceSpan(source, start, start + Int());
    }

    private byte Byte() => bytes.Span[_at++];

    private int Int()
    {
        var (value, shift) = (0u, 0);
        while (true)
        {
            var part = Byte();
            value |= (uint)(part & 0x7F) << shift;
            if (part < 0x80)
            {
                return (int)value;
            }

            shift += 7;
        }
    }

    private string Text()
    {
        var length = Int();
        _at += length;
        return Encoding.UTF8.GetString(bytes.Span.Slice(_at - length, length));
    }

    private double Double()
    {
        _at += sizeof(double);
        return BinaryPrimitives.ReadDoubleLittleEndian(bytes.Span[(_at - sizeof(double))..]);
    }
}
