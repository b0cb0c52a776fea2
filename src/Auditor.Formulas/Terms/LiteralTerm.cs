using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Terms;

/// <summary>A constant.</summary>
internal sealed class LiteralTerm(FormulaType type, SourceSpan span, Value value) : Term(type, span)
{
    public Value Constant { get; } = value;

    public override Value Evaluate(Scope scope) => Constant;
}
