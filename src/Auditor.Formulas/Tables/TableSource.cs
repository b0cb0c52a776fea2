namespace Auditor.Formulas.Tables;

/// <summary>A table file: what its figures are and where they come from.</summary>
/// <param name="Id">Its unique name.</param>
/// <param name="Title">What it is, such as "BS 7671 Table 4D5".</param>
/// <param name="Sources">The publications, or "from memory", or "common practice".</param>
/// <param name="Path">Display path of the file.</param>
public sealed record TableSource(string Id, string Title, IReadOnlyList<string> Sources, string Path);
