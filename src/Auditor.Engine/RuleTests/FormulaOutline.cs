namespace Auditor.Engine.RuleTests;

/// <summary>
/// The skeleton of the text of a formula: its comparisons, and the conditions that "and" and "or" join. <c>??</c> binds
/// more loosely than <c>||</c>, that more loosely than <c>&amp;&amp;</c>, and that more loosely than a comparison.
/// </summary>
public static class FormulaOutline
{
    /// <summary>All comparisons of a formula that binds without problems, in order.</summary>
    public static IReadOnlyList<FormulaComparison> Comparisons(string formula)
    {
        var marks = FormulaMark.Of(formula);
        return [.. marks.Select((mark, i) => (mark, i)).Where(pair => pair.mark.IsComparison).Select(pair =>
            new FormulaComparison(new FormulaPart(pair.mark.Start, pair.mark.Text), RightOf(formula, marks, pair.i)))];
    }

    /// <summary>The conditions that a formula joins by <c>&amp;&amp;</c> at its top; the whole formula where it is something else.</summary>
    public static IReadOnlyList<FormulaPart> Conjuncts(string formula) => Split(formula, new FormulaPart(0, formula), "&&", "||", "??");

    /// <summary>
    /// The innermost conditions that a formula joins by <c>&amp;&amp;</c> and <c>||</c>, brackets and negations around them taken off.
    /// </summary>
    public static IReadOnlyList<FormulaPart> Conditions(string formula) => [.. Innermost(formula, FormulaPart.Of(formula, 0, formula.Length))];

    private static IEnumerable<FormulaPart> Innermost(string formula, FormulaPart whole)
    {
        var parts = Split(formula, whole, "||", "??");
        parts = parts.Count > 1 ? parts : Split(formula, whole, "&&", "??");
        if (parts.Count > 1)
        {
            return parts.SelectMany(part => Innermost(formula, part));
        }

        return Inside(formula, whole) is { } inner ? Innermost(formula, inner) : [whole];
    }

    /// <summary>What stands between brackets, negated or not, that enclose the whole part; null where none do.</summary>
    private static FormulaPart? Inside(string formula, FormulaPart whole)
    {
        var open = whole.Text.StartsWith('!') ? FormulaPart.Of(formula, whole.Start + 1, whole.End) : whole;
        var marks = FormulaMark.Of(open.Text);
        var encloses = marks is [{ Start: 0, Text: "(" }, ..]
            && marks.First(mark => mark is { Text: ")", Depth: 0 }).End == open.Text.Length;
        return encloses ? FormulaPart.Of(formula, open.Start + 1, open.End - 1) : null;
    }

    /// <summary>Splits at a sign outside all brackets, unless a sign that binds more loosely stands there as well.</summary>
    private static List<FormulaPart> Split(string formula, FormulaPart whole, string sign, params ReadOnlySpan<string> looser)
    {
        var marks = FormulaMark.Of(whole.Text);
        var parts = new List<FormulaPart>();
        var from = whole.Start;
        foreach (var mark in marks)
        {
            if (mark.Depth == 0 && looser.Contains(mark.Text))
            {
                return [whole];
            }

            if (mark.Depth == 0 && mark.Text == sign)
            {
                parts.Add(FormulaPart.Of(formula, from, whole.Start + mark.Start));
                from = whole.Start + mark.End;
            }
        }

        parts.Add(FormulaPart.Of(formula, from, whole.End));
        return parts;
    }

    private static FormulaPart RightOf(string formula, IReadOnlyList<FormulaMark> marks, int index)
    {
        var depth = marks[index].Depth;
        var next = marks.Skip(index + 1).FirstOrDefault(mark => mark.Depth < depth || (mark.Depth == depth && mark.Text is not ("(" or ")")));
        return FormulaPart.Of(formula, marks[index].End, next.Text is null ? formula.Length : next.Start);
    }
}
