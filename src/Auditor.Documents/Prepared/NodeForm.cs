namespace Auditor.Documents;

/// <summary>How a node is written down: its first byte.</summary>
internal enum NodeForm : byte
{
    /// <summary>A mapping: how many entries, then each key and its value.</summary>
    Mapping,

    /// <summary>A list: how many items, then each.</summary>
    Sequence,

    /// <summary>A text as it stands in the source.</summary>
    PlainText,

    /// <summary>A text that stands otherwise in the source, as with quotes or folded lines: the text itself follows.</summary>
    OtherText,

    /// <summary>A number, which follows.</summary>
    Number,

    /// <summary>A flag.</summary>
    Flag,

    /// <summary>Nothing.</summary>
    Null,
}
