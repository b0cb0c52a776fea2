using Auditor.Documents;
using Auditor.Formulas;

namespace Auditor.Engine.RuleTests;

/// <summary>A formula after a change.</summary>
/// <param name="Formula">The changed formula, bound.</param>
/// <param name="Span">What was changed, in the rule file.</param>
/// <param name="Change">The change in words.</param>
internal sealed record FormulaMutant(Formula Formula, SourceSpan Span, string Change);
