using Auditor.Engine.Adjustments;
using Auditor.Engine.RuleSets;
using Auditor.Engine.Variation;

namespace Auditor.Engine.Guarded;

/// <summary>Finds the worst case within the tolerances of a design for every rule that they reach.</summary>
public static class GuardedAcceptance
{
    /// <summary>The worst cases, of rules that apply as stated and of rules that a tolerance can make apply and fail.</summary>
    /// <param name="map">The map of the design.</param>
    /// <param name="inputs">Its toleranced inputs.</param>
    /// <returns>The worst case of each rule at a subject; none where the tolerances make no difference, or nothing can be told as stated.</returns>
    public static IReadOnlyDictionary<RuleAt, WorstCase> Run(DependencyMap map, IReadOnlyList<TolerancedInput> inputs)
    {
        var bySubject = ReachedBySubject(map, inputs, _ => true);
        var found = new List<(RuleAt At, WorstCase Case)>[bySubject.Count];
        Parallel.For(0, bySubject.Count, i => found[i] = OfSubject(map, inputs, [], bySubject[i]));
        return found.SelectMany(list => list).ToDictionary(pair => pair.At, pair => pair.Case);
    }

    /// <summary>The worst cases of some rules in a design with changes.</summary>
    /// <param name="map">The map of the design as it is.</param>
    /// <param name="inputs">The toleranced inputs, with the values that they have after the changes.</param>
    /// <param name="changes">The changes.</param>
    /// <param name="rules">The rules to look into.</param>
    internal static IReadOnlyDictionary<RuleAt, WorstCase> Run(
        DependencyMap map, IReadOnlyList<TolerancedInput> inputs, IReadOnlyList<ChangedInput> changes, IReadOnlySet<RuleAt> rules) =>
        ReachedBySubject(map, inputs, rules.Contains).SelectMany(reached => OfSubject(map, inputs, changes, reached)).ToDictionary(pair => pair.At, pair => pair.Case);

    private static List<IReadOnlyList<(RuleAt At, List<int> Inputs)>> ReachedBySubject(
        DependencyMap map, IReadOnlyList<TolerancedInput> inputs, Func<RuleAt, bool> isWanted)
    {
        var bySubject = new SortedDictionary<int, Dictionary<Rule, (RuleAt At, List<int> Inputs)>>();
        for (var input = 0; input < inputs.Count; input++)
        {
            foreach (var at in map.ReachOf(inputs[input].Input).Rules.Where(isWanted))
            {
                if (!bySubject.TryGetValue(at.Subject.Index, out var rules))
                {
                    bySubject.Add(at.Subject.Index, rules = []);
                }

                if (!rules.TryGetValue(at.Rule, out var reached))
                {
                    rules.Add(at.Rule, reached = (at, []));
                }

                reached.Inputs.Add(input);
            }
        }

        return [.. bySubject.Values.Select(rules => (IReadOnlyList<(RuleAt, List<int>)>)[.. rules.Values.OrderBy(pair => pair.At.Rule.Id, StringComparer.Ordinal)])];
    }

    private static List<(RuleAt At, WorstCase Case)> OfSubject(
        DependencyMap map, IReadOnlyList<TolerancedInput> inputs, IReadOnlyList<ChangedInput> changes, IReadOnlyList<(RuleAt At, List<int> Inputs)> reached)
    {
        var used = reached.SelectMany(rule => rule.Inputs).Distinct().Order().ToArray();
        var probe = new Probe(map, [.. used.Select(input => inputs[input])], changes);
        var rules = reached.Select(rule => (rule.At, (IReadOnlyList<int>)[.. rule.Inputs.Select(input => Array.BinarySearch(used, input))])).ToArray();
        return new SubjectSearch(probe, rules).Run();
    }
}
