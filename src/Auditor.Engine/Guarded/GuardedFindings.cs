using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Guarded;

/// <summary>Adds to findings what the tolerances of the design make of them.</summary>
internal static class GuardedFindings
{
    private const string DecisionInput = "basis.decision";

    /// <summary>The decision rule that a design asks for; simple where it asks for none.</summary>
    public static Decision AskedBy(Design design) =>
        design.Installation.Shape.Input(DecisionInput) is { } slot && design.Installation.Input(slot.Index) is { Kind: ValueKind.Text, Text: "guarded" }
            ? Decision.Guarded
            : Decision.Simple;

    /// <summary>The findings with their worst cases and shares; by guarded acceptance also those of rules that only a tolerance makes apply.</summary>
    public static List<Finding> Complete(Design design, List<Finding> findings, Decision decision, Acceptance acceptance)
    {
        var inputs = ToleranceReader.Read(design);
        if (inputs.Count == 0)
        {
            return findings;
        }

        var map = new DependencyMap(design);
        var cases = GuardedAcceptance.Run(map, inputs);
        var shares = acceptance.Samples > 0
            ? Sampler.Run(map, inputs, [.. cases.Keys.OrderBy(at => at.Subject.Index).ThenBy(at => at.Rule.Id, StringComparer.Ordinal)], acceptance.Samples, acceptance.Seed)
            : new Dictionary<RuleAt, SampleShare>();
        var completed = findings.ConvertAll(finding => Complete(finding, cases, shares, decision));
        if (decision == Decision.Guarded)
        {
            var known = completed.Select(finding => new RuleAt(finding.Rule, finding.Subject)).ToHashSet();
            completed.AddRange(cases.Where(pair => !known.Contains(pair.Key)).Select(pair => OnlyWithin(map, pair.Key, pair.Value, shares)));
            completed = [.. completed.OrderBy(finding => finding.Subject.Index).ThenBy(finding => finding.Rule.Id, StringComparer.Ordinal)];
        }

        return completed;
    }

    private static Finding Complete(
        Finding finding, IReadOnlyDictionary<RuleAt, WorstCase> cases, IReadOnlyDictionary<RuleAt, SampleShare> shares, Decision decision)
    {
        var at = new RuleAt(finding.Rule, finding.Subject);
        return cases.GetValueOrDefault(at) is not { } worst
            ? finding
            : new Finding(finding.Rule, finding.Subject, finding.Judgement)
            {
                WorstCase = worst,
                Share = shares.GetValueOrDefault(at),
                IsUnproven = decision == Decision.Guarded && finding.Judgement.Verdict == Verdict.Conforms && !worst.IsKept,
            };
    }

    /// <summary>The finding of a rule that does not apply as stated, but applies and fails in the worst case.</summary>
    private static Finding OnlyWithin(DependencyMap map, RuleAt at, WorstCase worst, IReadOnlyDictionary<RuleAt, SampleShare> shares)
    {
        var variant = new Variant(map, [.. worst.Corner.Select(value => value.Input.Input)]);
        for (var i = 0; i < worst.Corner.Count; i++)
        {
            variant.Set(i, worst.Corner[i].Input.At(worst.Corner[i].Number));
        }

        return new Finding(at.Rule, at.Subject, worst.Judgement)
        {
            WorstCase = worst,
            Share = shares.GetValueOrDefault(at),
            IsUnproven = true,
            Scope = variant.Of(at.Subject).Scope,
        };
    }
}
