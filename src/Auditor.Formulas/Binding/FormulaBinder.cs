using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;

namespace Auditor.Formulas.Binding;

/// <summary>Reads, checks and binds the formulas of a rule set.</summary>
public static class FormulaBinder
{
    /// <summary>Binds one formula.</summary>
    /// <param name="source">The scalar that holds it in the rule file.</param>
    /// <param name="shape">Shape of the subjects it is computed for.</param>
    /// <param name="world">Tables, curves and parameters that it may use.</param>
    /// <param name="declared">What it must give; null where anything will do.</param>
    /// <param name="problems">Receives what is wrong, each with its place in the formula.</param>
    /// <returns>The formula; null when something is wrong with it.</returns>
    public static Formula? Bind(ScalarNode source, SubjectShape shape, FormulaWorld world, FormulaType? declared, Problems problems)
    {
        var formula = Binder.Bind(source, shape, world, problems);
        if (formula is null || declared is null || formula.Type.Equals(declared))
        {
            return formula;
        }

        problems.Add(FormulaMessages.WrongResult(source.Span, declared, formula.Type));
        return null;
    }

    /// <summary>Tells of a word that a formula writes out and that the input it is compared with can never be.</summary>
    /// <param name="value">The formula of the value.</param>
    /// <param name="limit">The formula that it is compared with.</param>
    /// <param name="problems">Receives the word.</param>
    public static void CheckWords(Formula value, Formula limit, Problems problems)
    {
        Binder.CheckWord(value.Root, limit.Root, problems);
        Binder.CheckWord(limit.Root, value.Root, problems);
    }
}
