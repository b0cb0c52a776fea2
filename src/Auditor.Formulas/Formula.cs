using Auditor.Documents;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Terms;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;
using Auditor.Quantities;

namespace Auditor.Formulas;

/// <summary>A formula of a rule file, checked against what its subject has and ready to be evaluated.</summary>
/// <param name="Source">The scalar that holds it in the rule file.</param>
/// <param name="Root">The bound expression.</param>
/// <param name="References">The inputs and quantities that it reads, each once per route.</param>
public sealed record Formula(ScalarNode Source, Term Root, IReadOnlyList<Reference> References)
{
    /// <summary>The formula as written.</summary>
    public string Text => Source.Text;

    /// <summary>What it gives.</summary>
    public FormulaType Type => Root.Type;

    /// <summary>Unit in which people read it; null for anything but a quantity.</summary>
    public Unit? Unit => Type.Kind == FormulaKind.Quantity ? Root.Unit ?? Coherent(Type.Dimension) : null;

    /// <summary>Its value in a scope; missing where it cannot be computed.</summary>
    public Value Evaluate(Scope scope) => Root.Evaluate(scope);

    private static Unit? Coherent(Dimension dimension)
    {
        var units = UnitCatalog.Of(dimension);
        return units.Count > 0 ? units[0] : UnitCatalog.Find(dimension.ToString());
    }
}
