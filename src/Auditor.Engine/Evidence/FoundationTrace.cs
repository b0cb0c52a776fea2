using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Curves;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Evidence;

/// <summary>Gathers what one evaluation of a formula rests on.</summary>
/// <param name="rules">The rule set.</param>
/// <param name="sets">Makes the sets.</param>
/// <param name="ofQuantity">What a quantity rests on.</param>
internal sealed class FoundationTrace(RuleSet rules, FoundationSets sets, Func<DesignSubject, QuantitySlot, FoundationSet> ofQuantity) : ITrace
{
    /// <summary>What was gathered so far.</summary>
    public FoundationSet Found { get; private set; } = FoundationSet.None;

    public void Read(SourceSpan term, ISubject subject, InputSlot slot, in Value value)
    {
        if (value.Marks.HasFlag(Marks.Assumed))
        {
            var holder = (DesignSubject)subject;
            var source = holder.Source(slot)!;
            Add(new Foundation(FoundationKind.AssumedInput, holder.Key, slot.Path, source.Text, source.Span));
        }
    }

    public void Read(SourceSpan term, ISubject subject, QuantitySlot slot, in Value value)
    {
        if (value.Marks != Marks.None)
        {
            Found = sets.Union(Found, ofQuantity((DesignSubject)subject, slot));
        }
    }

    public void Read(SourceSpan term, ParameterSlot slot, in Value value)
    {
        if (value.Marks != Marks.None)
        {
            var parameter = rules.Parameters[slot.Index];
            Add(new Foundation(FoundationKind.FigureFromMemory, null, "param." + slot.Name, parameter.Text, parameter.Span));
        }
    }

    public void Read(SourceSpan term, Lookup lookup, IReadOnlyList<TableCell> cells, in Value value, Quantities.Unit? unit)
    {
        foreach (var cell in cells)
        {
            if (cell.Trust.Mark() != Marks.None)
            {
                Add(new Foundation(FoundationKind.FigureFromMemory, null, cell.Table.Title, "", null));
            }
        }
    }

    public void Read(SourceSpan term, Curve curve, string reading, in Value value, Quantities.Unit unit)
    {
        if (value.Marks != Marks.None)
        {
            Add(new Foundation(FoundationKind.FigureFromMemory, null, curve.Source.Title, "", null));
        }
    }

    /// <summary>The value of a whole term rests on what its parts read.</summary>
    public void Whole(SourceSpan term, in Value value, Quantities.Unit? unit)
    {
    }

    private void Add(Foundation foundation) => Found = sets.Union(Found, sets.Of(foundation));
}
