using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Subjects;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Evaluation;

/// <summary>Decides one rule on one subject. A condition, value or limit that is missing makes the verdict undetermined.</summary>
public static class Judge
{
    private static readonly Judgement NotApplicable = new(null, default, [], null, null, Marks.None);

    /// <summary>Judges a rule.</summary>
    public static Judgement Decide(Rule rule, Scope scope)
    {
        var when = rule.When?.Evaluate(scope) ?? Value.Of(true);
        if (when.IsFalse)
        {
            return NotApplicable;
        }

        if (when.IsMissing)
        {
            return new Judgement(Verdict.Undetermined, when, [], null, when.Absences, when.Marks);
        }

        var value = rule.Check.Value.Evaluate(scope);
        var limits = new Value[rule.Check.Limits.Count];
        var missing = value;
        var marks = when.Marks | value.Marks;
        for (var i = 0; i < limits.Length; i++)
        {
            limits[i] = rule.Check.Limits[i].Evaluate(scope);
            marks |= limits[i].Marks;
            if (limits[i].IsMissing)
            {
                missing = Value.MissingFrom(missing, limits[i]);
            }
        }

        if (missing.IsMissing)
        {
            return new Judgement(Verdict.Undetermined, value, limits, null, missing.Absences, marks);
        }

        var (keeps, margin) = Compare(rule.Check.How, value, limits);
        return new Judgement(keeps ? Verdict.Conforms : Verdict.Nonconforming, value, limits, margin, null, marks);
    }

    private static (bool Keeps, Margin? Margin) Compare(CheckKind how, in Value value, Value[] limits)
    {
        switch (how)
        {
            case CheckKind.AtMost:
                return (Comparison.AtMost(value.Number, limits[0].Number), MarginOf(value.Number, limits[0].Number, -1));
            case CheckKind.AtLeast:
                return (Comparison.AtLeast(value.Number, limits[0].Number), MarginOf(value.Number, limits[0].Number, 1));
            case CheckKind.Within:
                var (low, high) = (limits[0].Number, limits[1].Number);
                var below = MarginOf(value.Number, low, 1);
                var above = MarginOf(value.Number, high, -1);
                return (Comparison.AtLeast(value.Number, low) && Comparison.AtMost(value.Number, high), below.Absolute <= above.Absolute ? below : above);
            case CheckKind.Equal:
                return (Same(value, limits[0]), null);
            case CheckKind.OneOf:
                var sought = value;
                return (Array.Exists(limits, limit => Same(sought, limit)), null);
            default:
                return (value.Flag, null);
        }
    }

    private static bool Same(in Value a, in Value b) => a.Kind == ValueKind.Text ? a.Text == b.Text : Comparison.Same(a.Number, b.Number);

    /// <summary>A value that is at its limit within the slack has no distance to it, so that a margin is never on another side than its verdict.</summary>
    private static Margin MarginOf(double value, double limit, int right)
    {
        var distance = Comparison.Same(value, limit) ? 0 : (value - limit) * right;
        return new Margin(distance, limit == 0 ? null : distance / Math.Abs(limit));
    }
}
