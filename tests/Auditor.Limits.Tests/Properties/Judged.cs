using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Values;

namespace Auditor.Limits.Tests.Properties;

/// <summary>A design with what every rule says of every subject, and every quantity at hand.</summary>
internal sealed class Judged(Design design, RuleSet rules)
{
    /// <summary>What each rule says of each subject, those that do not apply included.</summary>
    public IReadOnlyDictionary<(string Rule, string Subject), Judgement> Judgements { get; } =
        (from subject in design.Subjects from rule in rules.RulesOf(subject.Shape) select (Key: (rule.Id, subject.Key), Judgement: Judge.Decide(rule, subject.Scope)))
        .ToDictionary(pair => pair.Key, pair => pair.Judgement);

    /// <summary>Keys of the subjects of a kind.</summary>
    public IReadOnlyList<string> Keys(string shape) => [.. design.Subjects.Where(subject => subject.Shape.Name == shape).Select(subject => subject.Key)];

    public static Judged Of(Plan plan, RuleSet rules) => new(plan.Build(rules), rules);

    /// <summary>A quantity of a subject; null where it is missing.</summary>
    public double? Number(string key, string symbol)
    {
        var value = Value(key, symbol);
        return value.IsMissing ? null : value.Number;
    }

    /// <summary>Whether a flag of a subject is given and true.</summary>
    public bool Holds(string key, string symbol) => Value(key, symbol).IsTrue;

    private Value Value(string key, string symbol)
    {
        var subject = design.Find(key)!;
        return subject.Quantity(subject.Shape.Quantity(symbol)!.Index);
    }
}
