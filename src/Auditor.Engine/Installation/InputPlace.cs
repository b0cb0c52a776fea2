namespace Auditor.Engine.Installation;

/// <summary>How to find an input in the design file: the keys from the subject's own mapping, and the named type that may hold it instead.</summary>
/// <param name="Keys">Keys from the subject's mapping down to the value.</param>
/// <param name="NamedAt">How many keys lead to the mapping whose <c>type</c> may name an entry of <c>types</c>; -1 where none does.</param>
/// <param name="Types">Entry of <c>types</c> that holds the named types, such as <c>cables</c>; null where there is none.</param>
/// <param name="Bounds">Between which values it may lie.</param>
internal sealed record InputPlace(IReadOnlyList<string> Keys, int NamedAt, string? Types, InputBounds Bounds);
