namespace Auditor.Documents;

/// <summary>Leaves the reading of a file that cannot be read any further; caught where the reading began.</summary>
/// <param name="problem">What to report.</param>
internal sealed class UnreadableException(Problem problem) : Exception
{
    public Problem Problem { get; } = problem;
}
