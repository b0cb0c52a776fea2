using System.Runtime.CompilerServices;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Evaluation;

/// <summary>Computes the quantities of a rule set for any subject; each subject keeps its own results.</summary>
/// <param name="rules">The rule set.</param>
public sealed class Evaluator(RuleSet rules)
{
    private readonly Value[] _parameters = [.. rules.Parameters.Select(parameter => parameter.Value)];

    /// <summary>The rule set.</summary>
    public RuleSet Rules { get; } = rules;

    /// <summary>Value of a parameter.</summary>
    public Value Parameter(int slot) => _parameters[slot];

    /// <summary>
    /// Computes a quantity in a scope of its subject; what it reads is taken from the subjects. Missing where quantities rest on one
    /// another in a chain so long that the stack would not hold it: a rule file must not bring the program down.
    /// </summary>
    public Value Compute(SubjectShape shape, int slot, Scope scope) => RuntimeHelpers.TryEnsureSufficientExecutionStack()
        ? Rules.Quantity(shape, slot).Formula.Evaluate(scope)
        : Value.Missing(new Absence(AbsenceKind.NotFinite, scope.Subject.Key, shape.Quantities[slot].Symbol, "too many quantities rest on one another", ""));
}
