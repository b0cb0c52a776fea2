using Auditor.Documents;
using Auditor.Engine.HouseSets;

namespace Auditor.Engine.RuleSets;

/// <summary>Puts the rules of a chain of sets together: a later set may replace a rule, drop it, or change what kind of provision it is.</summary>
/// <param name="reader">Reads rules.</param>
/// <param name="changes">Receives what house sets change.</param>
/// <param name="problems">Receives what is wrong.</param>
internal sealed class RuleComposer(RuleReader reader, HouseChanges changes, Problems problems)
{
    private const string Requirement = "requirement";

    private readonly Dictionary<string, (Rule Rule, int Set)> _rules = [];

    /// <summary>The rules, by id.</summary>
    public IReadOnlyList<Rule> All => [.. _rules.Values.Select(pair => pair.Rule).OrderBy(rule => rule.Id, StringComparer.Ordinal)];

    /// <summary>Enters a rule.</summary>
    /// <param name="file">Its file.</param>
    /// <param name="set">Number of its set in the chain; the sets come in order.</param>
    public void Enter(RuleFile file, int set)
    {
        var id = file.Root.Scalar("rule")!;
        var earlier = _rules.GetValueOrDefault(id.Text);
        if (id.Text.StartsWith(RuleHome.RecordPrefix, StringComparison.Ordinal))
        {
            problems.Add(RuleMessages.RecordRule(id.Span, id.Text));
        }
        else if (earlier.Rule is not null && earlier.Set == set)
        {
            problems.Add(RuleMessages.SecondRule(id.Span, id.Text, earlier.Rule.Path));
        }
        else if (reader.Read(file) is { } rule)
        {
            _rules[id.Text] = (rule, set);
            if (earlier.Rule is not null)
            {
                changes.Add(set, HouseChangeKind.Rule, id.Text, (earlier.Rule.Path, rule.Path), loosens: true, "replaced", id.Span);
            }
        }
    }

    /// <summary>Makes the changes that a set states.</summary>
    public void Change(SetFile file, int set)
    {
        foreach (var node in file.Root.Mappings("changes"))
        {
            var id = node.Scalar("rule")!;
            if (_rules.GetValueOrDefault(id.Text) is { Rule: { } rule, Set: var of })
            {
                Change(node, id, rule, set, of);
            }
            else
            {
                problems.Add(RuleMessages.ChangesUnknownRule(id.Span, id.Text, NearestWord.Find(id.Text, _rules.Keys)));
            }
        }
    }

    private void Change(MappingNode node, ScalarNode id, Rule rule, int set, int of)
    {
        if (node.Scalar("dropped") is { } dropped)
        {
            _rules.Remove(id.Text);
            changes.Add(set, HouseChangeKind.Rule, id.Text, (rule.Path, "nothing"), loosens: true, "dropped", dropped.Span);
            return;
        }

        if (node.Scalar("provision") is { } provision)
        {
            var raised = provision.Text == Requirement;
            Tell(set, HouseChangeKind.Provision, provision, id.Text, Word(rule.Provision), (!raised, raised ? "raised" : "lowered"));
            rule = rule with { Provision = raised ? Provision.Requirement : Provision.Recommendation };
        }

        if (node.Scalar("departures") is { } departures)
        {
            var allowed = departures.Text != "never";
            Tell(set, HouseChangeKind.Departures, departures, id.Text, rule.AllowsDepartures ? "allowed" : "never", (allowed, allowed ? "made possible" : "ruled out"));
            rule = rule with { AllowsDepartures = allowed };
        }

        _rules[id.Text] = (rule, of);
    }

    private void Tell(int set, HouseChangeKind what, ScalarNode stated, string id, string before, (bool Loosens, string How) change)
    {
        if (stated.Text == before)
        {
            problems.Add(RuleMessages.ChangesNothing(stated.Span, id, before));
        }
        else
        {
            changes.Add(set, what, id, (before, stated.Text), change.Loosens, change.How, stated.Span);
        }
    }

    private static string Word(Provision provision) => provision == Provision.Requirement ? Requirement : "recommendation";
}
