using Auditor.Documents;
using Auditor.Formulas.Types;

namespace Auditor.Engine.RuleTests;

/// <summary>All wordings of the stage that runs the cases of rule files.</summary>
internal static class CaseMessages
{
    public static Problem UnknownName(SourceSpan span, string name, string shape, string? nearest) => Problem.Error(
        "case-unknown-name", $"a {shape} has no `{name}` to be given", span, nearest is null ? "name an input or a quantity, as formulas do" : $"did you mean `{nearest}`?");

    public static Problem WrongValue(SourceSpan span, string name, FormulaType type) => Problem.Error(
        "case-wrong-value", $"`{name}` is {type}", span, "give it with a fitting unit, or the fitting word");

    public static Problem NotList(SourceSpan span, string name) => Problem.Error("case-not-a-list", $"`{name}` is a list of subjects", span, "write a list of mappings");

    public static Problem WrongExpectation(SourceSpan span, FormulaType type) => Problem.Error(
        "case-wrong-expectation", $"the quantity is {type}", span, "expect a value of that kind, or `missing`");

    public static Problem Failed(SourceSpan span, string owner, string name, string message) => Problem.Error(
        "case-failed", $"{owner}, case \"{name}\": {message}", span, null);
}
