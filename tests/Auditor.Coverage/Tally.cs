namespace Auditor.Coverage;

/// <summary>Counts of one assembly, or of all.</summary>
/// <param name="Name">Name of the assembly.</param>
/// <param name="LinesCovered">Lines with code that some test executed.</param>
/// <param name="LinesMissed">Lines with code that none did.</param>
/// <param name="BranchesCovered">Ways out of a condition that some test took.</param>
/// <param name="BranchesMissed">Ways out of a condition that none did.</param>
internal sealed record Tally(string Name, int LinesCovered, int LinesMissed, int BranchesCovered, int BranchesMissed);
