using Auditor.Documents;
using Auditor.Formulas.Binding;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Formulas.Tests;

/// <summary>Short ways to bind and evaluate a formula in a test.</summary>
internal static class Bound
{
    /// <summary>Binds a formula that must be without problems, by default one of a circuit.</summary>
    public static Formula Formula(string text, SubjectShape? shape = null)
    {
        var formula = TryFormula(text, shape ?? Plant.Circuit, out var problems);
        Assert.Equal("", ProblemText.Render(problems.All));
        return formula!;
    }

    public static Formula? TryFormula(string text, SubjectShape shape, out Problems problems)
    {
        problems = new Problems();
        var source = new SourceText("formula", text);
        return FormulaBinder.Bind(new ScalarNode(source.WholeSpan(), text, ScalarKind.Text), shape, RuleData.Example, null, problems);
    }

    /// <summary>The value of a formula for a subject, by default a circuit of which nothing is said.</summary>
    public static Value Value(string text, Thing? subject = null)
    {
        var thing = subject ?? new Thing(Plant.Circuit);
        return Formula(text, thing.Shape).Evaluate(thing.Scope);
    }

    public static double Number(string text, Thing? subject = null)
    {
        var value = Value(text, subject);
        Assert.Equal(ValueKind.Quantity, value.Kind);
        return value.Number;
    }

    /// <summary>A flag as <c>true</c> or <c>false</c>, or <c>missing</c>.</summary>
    public static string Truth(string text, Thing? subject = null) => Shown(Value(text, subject));

    public static string Shown(in Value value) => value.Kind switch
    {
        ValueKind.Missing => "missing",
        ValueKind.Flag => value.Flag ? "true" : "false",
        ValueKind.Quantity => value.Number.ToString("R"),
        ValueKind.Words => string.Join(" ", value.Words),
        _ => value.Text,
    };

    /// <summary>The reasons why a value is missing, one a line.</summary>
    public static string Reasons(in Value value) => string.Join('\n', value.Absences.Items);
}
