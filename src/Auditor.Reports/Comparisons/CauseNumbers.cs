using Auditor.Engine.Comparisons;

namespace Auditor.Reports.Comparisons;

/// <summary>Positions of changes in the lists of a comparison, by which findings name their causes.</summary>
internal sealed class CauseNumbers
{
    private readonly Dictionary<Change, int> _numbers = new(ReferenceEqualityComparer.Instance);

    public CauseNumbers(RevisionComparison comparison)
    {
        Number(comparison.Inputs);
        Number(comparison.Subjects);
        Number(comparison.RuleSet.Changes);
    }

    /// <summary>Position of a change in its own list, from 0.</summary>
    public int Of(Change change) => _numbers[change];

    private void Number(IEnumerable<Change> changes)
    {
        foreach (var (number, change) in changes.Index())
        {
            _numbers.Add(change, number);
        }
    }
}
