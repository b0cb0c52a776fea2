using Auditor.Formulas.Curves;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Tables;

namespace Auditor.Formulas.Binding;

/// <summary>What formulas of a rule set may call and name besides the subject they belong to.</summary>
/// <param name="Lookups">Table functions by name.</param>
/// <param name="Curves">Time-current curves.</param>
/// <param name="Parameters">Parameters by their name in formulas.</param>
public sealed record FormulaWorld(
    IReadOnlyDictionary<string, Lookup> Lookups, CurveSet Curves, IReadOnlyDictionary<string, ParameterSlot> Parameters);
