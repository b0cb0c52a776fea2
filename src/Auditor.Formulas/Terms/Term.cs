using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>A node of a bound formula: checked, and ready to be evaluated over any subject of its shape.</summary>
/// <param name="type">What it gives.</param>
/// <param name="span">Where it stands in the rule file.</param>
public abstract class Term(FormulaType type, SourceSpan span)
{
    /// <summary>What it gives.</summary>
    public FormulaType Type { get; } = type;

    /// <summary>Where it stands in the rule file.</summary>
    public SourceSpan Span { get; } = span;

    /// <summary>Unit in which people read it, where it follows from what it is made of; null where it does not.</summary>
    public virtual Unit? Unit => null;

    /// <summary>Its value in a scope. Never throws; what cannot be computed is missing.</summary>
    public abstract Value Evaluate(Scope scope);
}
