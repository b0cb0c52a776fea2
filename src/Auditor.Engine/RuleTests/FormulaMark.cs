using System.Runtime.InteropServices;

namespace Auditor.Engine.RuleTests;

/// <summary>A sign in the text of a formula that divides it: a bracket, a comma, a logical operator or a comparison.</summary>
/// <param name="Start">Index of its first character.</param>
/// <param name="Text">The sign.</param>
/// <param name="Depth">How many brackets are open around it; a bracket itself lies outside what it encloses.</param>
[StructLayout(LayoutKind.Auto)]
internal readonly record struct FormulaMark(int Start, string Text, int Depth)
{
    private static readonly string[] Signs = ["&&", "||", "??", "==", "!=", "<=", ">=", "<", ">", "(", ")", ","];

    public int End => Start + Text.Length;

    public bool IsComparison => Text is "==" or "!=" or "<=" or ">=" or "<" or ">";

    /// <summary>All signs of a formula, in order; words in quotation marks hold none.</summary>
    public static IReadOnlyList<FormulaMark> Of(string formula)
    {
        var marks = new List<FormulaMark>();
        var depth = 0;
        for (var at = 0; at < formula.Length;)
        {
            if (formula[at] is '\'' or '"')
            {
                at = AfterWord(formula, at);
                continue;
            }

            var from = at;
            if (Array.Find(Signs, sign => formula.AsSpan(from).StartsWith(sign)) is not { } found)
            {
                at++;
                continue;
            }

            depth -= found == ")" ? 1 : 0;
            marks.Add(new FormulaMark(at, found, depth));
            depth += found == "(" ? 1 : 0;
            at += found.Length;
        }

        return marks;
    }

    private static int AfterWord(string formula, int quote)
    {
        var close = formula.IndexOf(formula[quote], quote + 1);
        return close < 0 ? formula.Length : close + 1;
    }
}
