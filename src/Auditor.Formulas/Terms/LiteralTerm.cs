using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas.Terms;

/// <summary>A constant.</summary>
internal sealed class LiteralTerm(FormulaType type, SourceSpan span, Value value, Unit? unit = null) : Term(type, span)
{
    public Value Constant { get; } = value;

    public override Unit? Unit => unit;

    public override Value Evaluate(Scope scope) => Constant;
}
