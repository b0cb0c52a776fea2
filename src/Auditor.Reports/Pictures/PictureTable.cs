namespace Auditor.Reports.Pictures;

/// <summary>The data behind a picture, as texts ready to be shown.</summary>
/// <param name="Caption">What the table holds, and what the picture leaves out.</param>
/// <param name="Headings">Headings of the columns.</param>
/// <param name="Rows">The rows; each has a text for each heading.</param>
public sealed record PictureTable(string Caption, IReadOnlyList<string> Headings, IReadOnlyList<IReadOnlyList<string>> Rows);
