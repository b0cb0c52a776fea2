using Auditor.Documents;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Terms;
using Auditor.Formulas.Types;
using Scriban.Syntax;

namespace Auditor.Formulas.Binding;

/// <summary>
/// Binds the tree of a formula to the slots of a shape, checks every dimension, and gathers what it refers to.
/// A part with a problem gives null, and one problem is told only once.
/// </summary>
internal sealed partial class Binder(ScalarNode source, FormulaWorld world, Problems problems)
{
    private readonly HashSet<Reference> _references = [];

    /// <summary>Binds a formula.</summary>
    /// <param name="source">The scalar that holds it.</param>
    /// <param name="shape">Shape of its subject.</param>
    /// <param name="world">What it may call.</param>
    /// <param name="problems">Receives what is wrong with it.</param>
    /// <returns>The formula, or null when something is wrong.</returns>
    public static Formula? Bind(ScalarNode source, SubjectShape shape, FormulaWorld world, Problems problems)
    {
        var expression = FormulaParser.Parse(source, problems);
        if (expression is null)
        {
            return null;
        }

        var binder = new Binder(source, world, problems);
        var root = binder.Bind(expression, new Site(shape, null, null));
        return root is null ? null : new Formula(source, root, [.. binder._references]);
    }

    /// <summary>Binds anything that gives a value; a group of inputs gives none.</summary>
    private Term? Bind(ScriptExpression expression, Site site)
    {
        var term = BindAny(expression, site);
        return term?.Type.Kind == FormulaKind.Group ? Fail(FormulaMessages.GroupAlone(term.Span, term.Span.Text)) : term;
    }

    private Term? BindAny(ScriptExpression expression, Site site) => expression switch
    {
        ScriptLiteral literal => BindLiteral(literal),
        ScriptVariable or ScriptThisExpression or ScriptMemberExpression => BindName(expression, site),
        ScriptNestedExpression { Expression: { } inner } => BindAny(inner, site),
        ScriptUnaryExpression unary => BindUnary(unary, site),
        ScriptBinaryExpression binary => BindBinary(binary, site),
        ScriptFunctionCall call => BindCall(call, site),
        _ => Fail(FormulaMessages.NotAllowed(SpanOf(expression), "this")),
    };

    private Term? Fail(Problem problem)
    {
        problems.Add(problem);
        return null;
    }

    private SourceSpan SpanOf(ScriptNode node) => FormulaParser.NodeSpan(source, node);

    /// <summary>Binds and demands a kind; null with a problem otherwise.</summary>
    private Term? Bind(ScriptExpression expression, Site site, FormulaKind kind, string what, string wanted)
    {
        var term = Bind(expression, site);
        return term is null || term.Type.Kind == kind ? term : Fail(FormulaMessages.Needs(term.Span, what, wanted, term.Type));
    }

    private Term? BindQuantity(ScriptExpression expression, Site site, string what) =>
        Bind(expression, site, FormulaKind.Quantity, what, "a quantity");

    private Term? BindFlag(ScriptExpression expression, Site site, string what) =>
        Bind(expression, site, FormulaKind.Flag, what, "true or false");

    private Term? BindText(ScriptExpression expression, Site site, string what) =>
        Bind(expression, site, FormulaKind.Text, what, "a text");
}
