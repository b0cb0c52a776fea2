using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Types;
using Auditor.Formulas.Values;

namespace Auditor.Engine.HouseSets;

/// <summary>Makes subjects of what a house set changes, so that rules can judge it.</summary>
internal static class ChangeSubjects
{
    private const string Prefix = "change/";
    private const string What = "what";
    private const string Name = "name";
    private const string Before = "before";
    private const string After = "after";
    private const string Loosens = "loosens";
    private const string How = "how";
    private const string Set = "set";

    /// <summary>Adds what formulas may ask of a change.</summary>
    public static void AddInputs(SubjectShape shape)
    {
        shape.AddInput(What, FormulaType.OneOf(HouseChangeWords.All), null);
        shape.AddInput(Loosens, FormulaType.Flag, null);
        foreach (var text in new[] { Name, Before, After, How, Set })
        {
            shape.AddInput(text, FormulaType.Text, null);
        }
    }

    /// <summary>One subject for each change, in their order; a second one of the same thing gets a number behind its key.</summary>
    public static IEnumerable<DesignSubject> Of(Design design)
    {
        var rules = design.Evaluator.Rules;
        var used = new Dictionary<string, int>(StringComparer.Ordinal);
        foreach (var change in rules.Changes)
        {
            var key = $"{Prefix}{change.What.Word()} {change.Name}";
            used[key] = used.GetValueOrDefault(key) + 1;
            yield return new DesignSubject(
                design, rules.Schema.Shapes.Change, used[key] == 1 ? key : $"{key} ({used[key]})", new MappingNode(change.Span, []), design.Evaluator)
            {
                Parent = design.Installation,
                Told = new Dictionary<string, Value>(StringComparer.Ordinal)
                {
                    [What] = Value.Of(change.What.Word()),
                    [Name] = Value.Of(change.Name),
                    [Before] = Value.Of(change.Before),
                    [After] = Value.Of(change.After),
                    [Loosens] = Value.Of(change.Loosens),
                    [How] = Value.Of(change.How),
                    [Set] = Value.Of(change.Set),
                },
            };
        }
    }
}
