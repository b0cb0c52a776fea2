namespace Auditor.Mutation;

/// <summary>One small fault put into the source.</summary>
/// <param name="Id">Its number, from 1.</param>
/// <param name="Place">File within the source folder, and line from 1.</param>
/// <param name="Change">What stood there, and what stands there instead.</param>
internal sealed record Mutant(int Id, string Place, string Change);
