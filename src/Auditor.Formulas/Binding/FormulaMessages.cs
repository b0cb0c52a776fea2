using Auditor.Documents;
using Auditor.Formulas.Types;

namespace Auditor.Formulas.Binding;

/// <summary>All wordings of the stage that reads and checks formulas.</summary>
internal static class FormulaMessages
{
    public static Problem Unreadable(SourceSpan span) => Problem.Error(
        "formula-unreadable", "the formula cannot be read here", span,
        "a formula has numbers with units, names, + - * / ^, comparisons, && || !, ?? and calls; nothing else");

    public static Problem TooLong(SourceSpan span, int most) => Problem.Error(
        "formula-too-long", $"a formula may have at most {most} characters", span, "split it into quantities of their own");

    public static Problem TooDeep(SourceSpan span, int most) => Problem.Error(
        "formula-too-deep", $"a formula may have at most {most} terms within one another or in one chain", span, "split it into quantities of their own");

    public static Problem Empty(SourceSpan span) => Problem.Error("formula-empty", "the formula is empty", span, "write an expression");

    public static Problem NotAllowed(SourceSpan span, string what) => Problem.Error(
        "formula-not-allowed", $"{what} may not stand in a formula", span, "write `choose(condition, then, otherwise)` for a choice; there are no assignments, loops, pipes or indexes");

    public static Problem UnknownName(SourceSpan span, string name, string shape, string? nearest) => Problem.Error(
        "unknown-symbol", $"{A(shape)} has no `{name}`", span, nearest is null ? "name a quantity of a sheet or an input of the design" : $"did you mean `{nearest}`?");

    public static Problem UnknownWayTarget(SourceSpan span, string way, string name, string shape, string? nearest) => Problem.Error(
        "unknown-symbol", $"`{way}` may lead to {A(shape)}, which has no `{name}`", span, nearest is null ? null : $"did you mean `{nearest}`?");

    public static Problem UnknownParameter(SourceSpan span, string name, string? nearest) => Problem.Error(
        "unknown-parameter", $"the rule set has no parameter `{name}`", span, nearest is null ? "give it in the set file" : $"did you mean `param.{nearest}`?");

    public static Problem UnknownFunction(SourceSpan span, string name, string? nearest) => Problem.Error(
        "unknown-function", $"there is no function `{name}`", span, nearest is null ? null : $"did you mean `{nearest}`?");

    public static Problem UnknownLookup(SourceSpan span, string name, string? nearest) => Problem.Error(
        "unknown-table", $"there is no lookup `{name}` among the tables", span, nearest is null ? null : $"did you mean `{nearest}`?");

    public static Problem UnknownWord(SourceSpan span, string word, IReadOnlyList<string> allowed, string? nearest) => Problem.Error(
        "unknown-word", $"`{word}` is none of the words allowed here", span,
        (nearest is null ? "" : $"did you mean `{nearest}`? ") + "allowed: " + string.Join(", ", allowed));

    public static Problem UnknownUnit(SourceSpan span, string name) => Problem.Error(
        "unknown-unit", $"`{name}` is not a unit, and a number directly before a name is read as a quantity", span, $"write `*` between the number and `{name}`");

    public static Problem LooseUnit(SourceSpan span, string name) => Problem.Error(
        "loose-unit", $"the unit `{name}` does not follow a number", span, $"put brackets around number and unit, as in `(30 {name})`");

    public static Problem SideBySide(SourceSpan span) => Problem.Error(
        "side-by-side", "two terms stand side by side", span, "write the operator between them; only a number and its unit need none");

    public static Problem NumberSuffix(SourceSpan span, string text) => Problem.Error(
        "number-suffix", $"`{text}` is not a number", span, "put a space between a number and its unit");

    public static Problem NumberTooLarge(SourceSpan span) => Problem.Error(
        "number-too-large", "this number is too large to calculate with", span, "choose a larger unit");

    public static Problem PowerBrackets(SourceSpan span) => Problem.Error(
        "power-brackets", "it is not clear what this power is of", span, "put brackets around a negative base, a unit or a further power");

    public static Problem PowerExponent(SourceSpan span) => Problem.Error(
        "power-exponent", "a quantity with a unit can only be raised to a number written out, in steps of ½", span, "write the exponent as a number such as 2 or 0.5");

    public static Problem Collection(SourceSpan span, string name) => Problem.Error(
        "collection-alone", $"`{name}` is a list of subjects", span, $"gather it: `sum_of({name}, …)`, min_of, max_of, count_of, all_of, any_of");

    public static Problem NotCollection(SourceSpan span, string shape, IEnumerable<string> names) => Problem.Error(
        "not-a-collection", $"{A(shape)} has no such list of subjects", span, "it has: " + string.Join(", ", names.DefaultIfEmpty("none")));

    public static Problem WayAlone(SourceSpan span, string name) => Problem.Error(
        "way-alone", $"`{name}` is a way to another subject, not a value", span, $"write what is meant there, as in `{name}.Zs`");

    public static Problem NoOuter(SourceSpan span) => Problem.Error(
        "no-outer-subject", "`this` reaches out of sum_of and its like, and there is none around it", span, "write the bare name");

    public static Problem GroupAlone(SourceSpan span, string name) => Problem.Error(
        "group-alone", $"`{name}` is a group of inputs", span, $"name one input of it, or ask `given({name})`");

    public static Problem Dimensions(SourceSpan span, string verb, FormulaType left, FormulaType right) => Problem.Error(
        "unit-mismatch", $"cannot {verb} {left} and {right}", span, "both sides need the same kind of value and the same unit");

    public static Problem Needs(SourceSpan span, string what, string wanted, FormulaType got) => Problem.Error(
        "wrong-type", $"{what} needs {wanted}, and this is {got}", span, null);

    public static Problem Pattern(SourceSpan span, string fault) => Problem.Error(
        "wrong-pattern", $"this pattern cannot be used: {fault}", span, "a pattern is a regular expression for the whole text, such as `[A-Z]{2}[0-9]+`");

    public static Problem Arguments(SourceSpan span, string function, string signature) => Problem.Error(
        "wrong-arguments", $"`{function}` is called as `{signature}`", span, null);

    public static Problem Overflow(SourceSpan span) => Problem.Error("unit-overflow", "the unit of this has no meaning", span, "check the powers");

    public static Problem WrongResult(SourceSpan span, FormulaType declared, FormulaType got) => Problem.Error(
        "wrong-result", $"the formula gives {got}, and {declared} is declared", span, "change the formula, or the declared unit");

    private static string A(string shape) => (shape[0] is 'a' or 'e' or 'i' or 'o' or 'u' ? "an " : "a ") + shape;
}
