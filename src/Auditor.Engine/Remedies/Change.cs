using Auditor.Engine.Adjustments;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Remedies;

/// <summary>One change to a design.</summary>
/// <param name="Place">What is adjusted.</param>
/// <param name="Value">The value that it takes.</param>
/// <param name="Effort">How great a change that is, compared with others.</param>
public sealed record Change(Adjustable Place, Value Value, int Effort);
