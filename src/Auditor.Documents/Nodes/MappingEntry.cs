namespace Auditor.Documents;

/// <summary>One key of a mapping and its value.</summary>
/// <param name="Key">The key as written, without quotes.</param>
/// <param name="Value">The value.</param>
public sealed record MappingEntry(Located<string> Key, Node Value);
