namespace Auditor.Documents;

/// <summary>The types of JSON Schema.</summary>
[Flags]
internal enum NodeTypes
{
    /// <summary>Every type.</summary>
    Any = 0,

    /// <summary>A mapping.</summary>
    Object = 1,

    /// <summary>A list.</summary>
    Array = 2,

    /// <summary>A text.</summary>
    String = 4,

    /// <summary>A number.</summary>
    Number = 8,

    /// <summary>A whole number.</summary>
    Integer = 16,

    /// <summary>A flag.</summary>
    Boolean = 32,

    /// <summary>Nothing.</summary>
    Null = 64,
}
