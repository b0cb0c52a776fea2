using Auditor.Engine.Limits;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Subjects;

namespace Auditor.Reports.Limits;

/// <summary>Says what the bounds of an input alone do not tell.</summary>
internal static class LimitNotes
{
    private const int MostRules = 4;

    public static IReadOnlyList<string> Of(InputLimit limit)
    {
        var notes = new List<string>();
        var slot = limit.Input.Adjustment.Slot;
        if (limit.Around is null)
        {
            notes.Add("no value keeps all requirements");
        }

        if (limit.Required.Count > 1)
        {
            notes.Add("not monotone: kept " + string.Join(" and ", limit.Required.Select(range => Words(range, slot))));
        }

        Unknown(notes, limit.Around?.Least, "below");
        Unknown(notes, limit.Around?.Most, "above");
        Advice(notes, limit);
        Never(notes, limit);
        if (limit is { IsGuarded: true, Guarded: null })
        {
            notes.Add("no reading keeps all requirements with the uncertainty of the instrument used up");
        }

        return notes;
    }

    private static string Words(AllowedRange range, InputSlot slot) =>
        LimitText.Range(range.Least?.Edge, range.Most?.Edge, slot) is { Length: > 0 } words ? words : "everywhere";

    private static void Unknown(List<string> notes, LimitBound? bound, string side)
    {
        if (bound is { Edge.IsUnknownBeyond: true })
        {
            notes.Add($"{side} it {bound.Rule.At.Rule.Id} cannot be judged");
        }
    }

    private static void Advice(List<string> notes, InputLimit limit)
    {
        if (limit.Advised is not { } advised || limit.Around is null)
        {
            return;
        }

        var (slot, subject) = (limit.Input.Adjustment.Slot, limit.Input.Subject);
        if (advised.Most is { } most && most.Edge.Position != limit.Around.Most?.Edge.Position)
        {
            notes.Add($"advised: at most {LimitText.Most(most.Edge, slot)} ({LimitText.Rule(most.Rule, subject)})");
        }

        if (advised.Least is { } least && least.Edge.Position != limit.Around.Least?.Edge.Position)
        {
            notes.Add($"advised: at least {LimitText.Least(least.Edge, slot)} ({LimitText.Rule(least.Rule, subject)})");
        }
    }

    private static void Never(List<string> notes, InputLimit limit)
    {
        var rules = limit.Rules
            .Where(rule => rule.Kind == LimitKind.AlwaysFails && rule.At.Rule.Provision == Provision.Requirement)
            .Select(rule => LimitText.Rule(rule, limit.Input.Subject))
            .ToArray();
        if (rules.Length > 0)
        {
            var more = rules.Length > MostRules ? $" and {rules.Length - MostRules} more" : "";
            notes.Add($"not kept at any value: {string.Join(", ", rules.Take(MostRules))}{more}");
        }
    }
}
