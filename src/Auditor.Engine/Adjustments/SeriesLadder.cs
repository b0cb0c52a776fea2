using Auditor.Formulas;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Adjustments;

/// <summary>The numbers that a lookup tabulates for its last key, such as the standard sizes of conductors.</summary>
/// <param name="Series">The lookup.</param>
/// <param name="Keys">Formulas for the keys before the last.</param>
public sealed record SeriesLadder(Lookup Series, IReadOnlyList<Formula> Keys) : Ladder
{
    /// <inheritdoc/>
    public override IReadOnlyList<Value> StepsAt(ISubject subject)
    {
        var keys = Keys.Select(key => key.Evaluate(subject.Scope)).ToArray();
        return Array.Exists(keys, key => key.IsMissing) ? [] : [.. Series.Series(keys).Select(number => Value.Of(number))];
    }
}
