using Auditor.Engine.RuleSets;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;

namespace Auditor.Engine.Variation;

/// <summary>A formula that reads a slot: that of a quantity, or one of a rule.</summary>
/// <param name="Shape">Kind of subject that the formula belongs to.</param>
/// <param name="Quantity">Slot of the quantity that it computes; -1 for a rule.</param>
/// <param name="Rule">The rule; null for a quantity.</param>
/// <param name="Route">How it gets from its own subject to the one read.</param>
internal readonly record struct Reader(SubjectShape Shape, int Quantity, Rule? Rule, Route? Route);
