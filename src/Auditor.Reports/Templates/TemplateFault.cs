using Auditor.Documents;
using Scriban.Syntax;

namespace Auditor.Reports.Templates;

/// <summary>Stops the writing of a report for a reason of ours, which becomes a problem once its place is known.</summary>
/// <param name="span">Where in the template.</param>
/// <param name="problem">Makes the problem for its place.</param>
internal sealed class TemplateFault(Scriban.Parsing.SourceSpan span, Func<SourceSpan, Problem> problem)
    : ScriptRuntimeException(span, "the template cannot be used")
{
    /// <summary>The problem at its place.</summary>
    public Problem Problem(SourceSpan place) => problem(place);
}
