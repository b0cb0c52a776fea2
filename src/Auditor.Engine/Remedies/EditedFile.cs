using Auditor.Documents;

namespace Auditor.Engine.Remedies;

/// <summary>A file of a design with changes in it.</summary>
/// <param name="Before">The text as it is.</param>
/// <param name="After">The text with the changes.</param>
public sealed record EditedFile(SourceText Before, string After);
