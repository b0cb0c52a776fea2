using Auditor.Documents;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.HouseSets;

/// <summary>Gathers what the house sets of a chain change while it is put together; what other sets change is their own matter.</summary>
/// <param name="chain">The sets, the base first.</param>
internal sealed class HouseChanges(IReadOnlyList<SetFile> chain)
{
    private readonly List<HouseChange> _all = [];

    /// <summary>The changes: by kind, then by name, then in the order of the sets.</summary>
    public IReadOnlyList<HouseChange> All => [.. _all.OrderBy(change => change.What).ThenBy(change => change.Name, StringComparer.Ordinal)];

    /// <summary>Whether a set of the chain is a house set.</summary>
    public bool IsHouse(int set) => chain[set].Standing == SetStanding.House;

    /// <summary>Keeps a change of a set.</summary>
    public void Add(int set, HouseChangeKind what, string name, (string Before, string After) values, bool loosens, string how, SourceSpan span)
    {
        if (IsHouse(set))
        {
            _all.Add(new HouseChange(what, name, values.Before, values.After, loosens, how, chain[set].Id, span));
        }
    }
}
