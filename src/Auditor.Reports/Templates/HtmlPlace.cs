namespace Auditor.Reports.Templates;

/// <summary>Where in an HTML text a character stands.</summary>
internal enum HtmlPlace
{
    /// <summary>Between tags.</summary>
    Text,

    /// <summary>After <c>&lt;</c>.</summary>
    TagStart,

    /// <summary>In the name of an element.</summary>
    TagName,

    /// <summary>In a tag, between attributes.</summary>
    Tag,

    /// <summary>In the name of an attribute.</summary>
    AttributeName,

    /// <summary>After <c>=</c>.</summary>
    BeforeValue,

    /// <summary>In a value between double quotes.</summary>
    DoubleQuoted,

    /// <summary>In a value between single quotes.</summary>
    SingleQuoted,

    /// <summary>In a value without quotes.</summary>
    Unquoted,

    /// <summary>In a document type or the like.</summary>
    Declaration,

    /// <summary>In a comment.</summary>
    Comment,

    /// <summary>In an element whose content is not text, such as a script.</summary>
    RawText,
}
