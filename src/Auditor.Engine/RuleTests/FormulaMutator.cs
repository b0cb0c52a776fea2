using Auditor.Documents;
using Auditor.Formulas;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;

namespace Auditor.Engine.RuleTests;

/// <summary>Changes the text of formulas and binds them again. A change that does not bind is none.</summary>
/// <param name="shape">Shape of the subject of the formulas.</param>
/// <param name="world">Tables, curves and parameters.</param>
internal sealed class FormulaMutator(SubjectShape shape, FormulaWorld world)
{
    private static readonly Dictionary<string, string[]> Turns = new()
    {
        ["=="] = ["!="],
        ["!="] = ["=="],
        ["<"] = ["<=", ">="],
        ["<="] = ["<", ">"],
        [">"] = [">=", "<="],
        [">="] = [">", "<"],
    };

    /// <summary>Every comparison turned into its contrary, and made to leave out or let in sameness.</summary>
    public IEnumerable<FormulaMutant> Turned(Formula formula) =>
        from comparison in FormulaOutline.Comparisons(formula.Text)
        from turned in Turns[comparison.Operator.Text]
        select Replaced(formula, comparison.Operator, turned, MutationMessages.Turned(comparison.Operator.Text, turned)) into mutant
        where mutant is not null
        select mutant;

    /// <summary>The right side of every comparison of more and less, shifted up and down.</summary>
    /// <param name="formula">The formula.</param>
    /// <param name="isCount">Whether a right side counts something, so that only a whole step is a change.</param>
    public IEnumerable<FormulaMutant> Shifted(Formula formula, Func<string, bool> isCount) =>
        FormulaOutline.Comparisons(formula.Text).Where(comparison => comparison.IsOrdered)
            .SelectMany(comparison => Shifted(formula, comparison.Right, isCount(comparison.Right.Text)));

    /// <summary>A whole formula shifted up and down.</summary>
    /// <param name="formula">The formula.</param>
    /// <param name="isCount">Whether it counts something, so that only a whole step is a change.</param>
    public IEnumerable<FormulaMutant> Shifted(Formula formula, bool isCount) =>
        Shifted(formula, FormulaPart.Of(formula.Text, 0, formula.Text.Length), isCount);

    /// <summary>The formula with parts of its text left out or put in place of the whole; null where that does not bind.</summary>
    public FormulaMutant? Rewritten(Formula formula, string text, FormulaPart place, string change) =>
        Bind(text, formula.Type) is { } bound
            ? new FormulaMutant(bound, formula.Source.SpanOf(place.Start, place.Text.Length), change)
            : null;

    /// <summary>A formula bound from a text; null where it does not bind.</summary>
    /// <param name="text">The text.</param>
    /// <param name="type">What it must give; null where anything will do.</param>
    public Formula? Bind(string text, FormulaType? type)
    {
        var source = new SourceText("changed", text);
        var node = new ScalarNode(new SourceSpan(source, 0, text.Length), text, ScalarKind.Text);
        return FormulaBinder.Bind(node, shape, world, type, new Problems());
    }

    private IEnumerable<FormulaMutant> Shifted(Formula formula, FormulaPart part, bool isCount)
    {
        if (IsZero(part.Text) && !isCount)
        {
            return [];
        }

        return isCount
            ? [.. Shift(formula, part, " + 1", "raised by 1"), .. Shift(formula, part, " - 1", "lowered by 1")]
            : [.. Shift(formula, part, " * 1.01", "raised by 1 %"), .. Shift(formula, part, " * 0.99", "lowered by 1 %"),
                .. Shift(formula, part, " + 1 K", "raised by 1 K"), .. Shift(formula, part, " - 1 K", "lowered by 1 K")];
    }

    /// <summary>Only one of the two ways to shift fits a quantity: temperatures cannot be multiplied, others have no kelvin added.</summary>
    private IEnumerable<FormulaMutant> Shift(Formula formula, FormulaPart part, string operation, string change) =>
        Replaced(formula, part, $"(({part.Text}){operation})", MutationMessages.Shifted(part.Text, change)) is { } mutant ? [mutant] : [];

    private FormulaMutant? Replaced(Formula formula, FormulaPart part, string text, string change) =>
        Rewritten(formula, formula.Text[..part.Start] + text + formula.Text[part.End..], part, change);

    /// <summary>A limit of nil stays nil however it is multiplied.</summary>
    private static bool IsZero(string text)
    {
        var number = text.TakeWhile(character => char.IsAsciiDigit(character) || character == '.').ToArray();
        return number.Length > 0 && Array.TrueForAll(number, character => character is '0' or '.');
    }
}
