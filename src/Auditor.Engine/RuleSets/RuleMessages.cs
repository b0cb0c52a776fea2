using Auditor.Documents;
using Auditor.Formulas.Types;

namespace Auditor.Engine.RuleSets;

/// <summary>All wordings of the stage that puts a rule set together.</summary>
internal static class RuleMessages
{
    public static Problem UnknownSet(SourceSpan? span, string name, string? nearest, IEnumerable<string> known) => Problem.Error(
        "unknown-rule-set", $"there is no shipped rule set `{name}`", span,
        (nearest is null ? "" : $"did you mean `{nearest}`? ") + "shipped sets: " + string.Join(", ", known) + "; or give the path of a set file");

    public static Problem NotMapping(SourceSpan span) => Problem.Error("rule-file-not-mapping", "a rule file holds keys and values", span, null);

    public static Problem UnknownKind(SourceSpan span, string key, IEnumerable<string> known) => Problem.Error(
        "unknown-rule-file", $"`{key}` does not say what this file is", span, "the first key of a rule file is one of: " + string.Join(", ", known));

    public static Problem OutsideRoot(SourceSpan span, string path) => Problem.Error(
        "rules-outside-folder", $"`{path}` lies outside the folder of this set", span, "a set uses only files of its own folder; build on others with `extends`");

    public static Problem UnreadableFolder(SourceSpan span, string path) => Problem.Error(
        "folder-unreadable", $"a folder in `{path}` cannot be looked into, so that a file in it would be passed over", span, "check its permissions");

    public static Problem NoSuchPath(SourceSpan span, string path) => Problem.Error("rules-not-found", $"there is no `{path}`", span, "paths are relative to the folder of the set's rule data");

    public static Problem ExtendsOutside(SourceSpan span, string path) => Problem.Error(
        "extends-outside-folder", $"`{path}` lies outside the folder of this set", span, "name a shipped set, or keep the set that this one builds on in the same folder");

    public static Problem LinkedSet(SourceSpan? span, string path) => Problem.Error(
        "rule-set-linked", $"`{path}` is reached by a symbolic link", span, "name the file of the set itself");

    public static Problem TighterRestated(SourceSpan span, string id, string before) => Problem.Error(
        "tighter-restated", $"parameter `{id}` has its stricter direction already: {before}", span, "leave `tighter` out; a set that builds on another does not turn it round");

    public static Problem ChangesUnknownRule(SourceSpan span, string id, string? nearest) => Problem.Error(
        "change-of-no-rule", $"there is no rule `{id}` to change", span, nearest is null ? "see `auditor rules list`" : $"did you mean `{nearest}`?");

    public static Problem ChangesNothing(SourceSpan span, string id, string what) => Problem.Warning(
        "change-of-nothing", $"this changes nothing: rule `{id}` has `{what}` already", span, "take the change out");

    public static Problem ExtendsTooLong(SourceSpan span, int most) => Problem.Error(
        "extends-too-long", $"more than {most} sets build on one another", span, "build on a set nearer to the base");

    public static Problem ParameterKind(SourceSpan span, string id, FormulaType value, FormulaType before) => Problem.Error(
        "parameter-kind", $"parameter `{id}` is {before}, and this is {value}", span, "a set may give a parameter another value, not another kind of value or unit");

    public static Problem ExtendsCircle(SourceSpan span, string name) => Problem.Error("extends-in-a-circle", $"set `{name}` extends itself", span, null);

    public static Problem SecondSymbol(SourceSpan span, string symbol, string shape, string other) => Problem.Error(
        "duplicate-symbol", $"there is a `{symbol}` of the {shape} already", span, $"it is {other}; choose another symbol");

    public static Problem SecondRule(SourceSpan span, string id, string otherPath) => Problem.Error(
        "duplicate-rule", $"there is a rule `{id}` already", span, $"it stands in {otherPath}; a house set may replace a rule, a set may not have it twice");

    public static Problem RecordRule(SourceSpan span, string id) => Problem.Error(
        "record-rule", $"no set may have a rule `{id}`", span, "the program keeps ids that begin with `record-` for its own rules about departures and house sets");

    public static Problem SecondPicture(SourceSpan span, string id, string otherPath) => Problem.Error(
        "duplicate-picture", $"there is a picture `{id}` already", span, $"it stands in {otherPath}; a house set may replace a picture, a set may not have it twice");

    public static Problem UnitOrGives(SourceSpan span) => Problem.Error(
        "unit-or-gives", "a quantity has either a `unit` or `gives: text` or `gives: flag`", span, null);

    public static Problem UnknownUnit(SourceSpan span, string unit) => Problem.Error("unknown-unit", $"`{unit}` is not a unit", span, "a pure number has the unit 1");

    public static Problem NoReading(SourceSpan span, string path, string shape, string? nearest) => Problem.Error(
        "unknown-input", $"a {shape} has no input `{path}`", span, nearest is null ? null : $"did you mean `{nearest}`?");

    public static Problem NotAdjustable(SourceSpan span, string path, FormulaType type) => Problem.Error(
        "not-adjustable", $"`{path}` is {type}", span, "a quantity or a word can be adjusted");

    public static Problem EmptyRange(SourceSpan span) => Problem.Error("empty-range", "this range holds nothing", span, "write the lesser value after `from`");

    public static Problem NoLookup(SourceSpan span, string name, string? nearest) => Problem.Error(
        "unknown-table", $"there is no lookup `{name}` among the tables", span, nearest is null ? null : $"did you mean `{nearest}`?");

    public static Problem NotSeries(SourceSpan span, string lookup, IEnumerable<string> keys) => Problem.Error(
        "not-a-series", $"{lookup} is no series for this input", span,
        $"its keys are {string.Join(", ", keys)}: give a formula for each but the last, which must be a quantity like the input");

    public static Problem StepType(SourceSpan span, string path, FormulaType wanted, FormulaType got) => Problem.Error(
        "wrong-type", $"`{path}` is {wanted}, and this is {got}", span, null);

    public static Problem StepWord(SourceSpan span, string word, string path, IEnumerable<string> words) => Problem.Error(
        "unknown-word", $"`{word}` is none of the words of `{path}`", span, "allowed: " + string.Join(", ", words));

    public static Problem SecondAdjustment(SourceSpan span, string id, string otherPath) => Problem.Error(
        "duplicate-adjustment", $"there is an adjustment `{id}` already", span, $"it stands in {otherPath}; a house set may replace one, a set may not have it twice");

    public static Problem UncertaintyUnit(SourceSpan span, string path, FormulaType reading, FormulaType got) => Problem.Error(
        "unit-mismatch", $"`{path}` is {reading}, and {got} cannot be its uncertainty", span, "an uncertainty has the unit of a difference between two readings");

    public static Problem SecondUncertainty(SourceSpan span, string path, string other) => Problem.Error(
        "duplicate-uncertainty", $"`{other}` is the uncertainty of `{path}` already", span, "a reading has one uncertainty");

    public static Problem Circle(SourceSpan span, string loop) => Problem.Error(
        "formulas-in-a-circle", $"these quantities need one another: {loop}", span, "one of them must be computed from something else");

    public static Problem Compare(SourceSpan span, string how, FormulaType value, FormulaType limit) => Problem.Error(
        "unit-mismatch", $"`{how}` cannot compare {value} with {limit}", span, "value and limit need the same kind of value and the same unit");

    public static Problem NotComparable(SourceSpan span, string how, FormulaType value) => Problem.Error(
        "wrong-type", $"`{how}` cannot compare {value}", span,
        "at-most, at-least and within are for quantities, equals and one-of for single words as well; `require: has(list, 'word')` asks a list");

    public static Problem CompareOnce(SourceSpan span) => Problem.Error(
        "compare-once", "`compare` has a `value` and exactly one of at-most, at-least, within, equals, one-of", span, null);

    public static Problem OpenBraces(SourceSpan span) => Problem.Error("open-braces", "`{{` is not closed by `}}`", span, "write a formula between double braces");

    public static Problem NameIsNotFile(SourceSpan span, string id, string file) => Problem.Warning(
        "rule-name", $"rule `{id}` stands in a file called `{file}`", span, $"call the file `{id}.yaml`");
}
