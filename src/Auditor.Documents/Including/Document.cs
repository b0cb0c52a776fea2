namespace Auditor.Documents;

/// <summary>A YAML document with everything that it includes put in its place.</summary>
/// <param name="Root">The root value.</param>
/// <param name="Inputs">The files that were read, each once, sorted by path.</param>
public sealed record Document(Node Root, IReadOnlyList<InputFile> Inputs);
