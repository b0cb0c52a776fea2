using Auditor.Documents;
using Auditor.Engine.Evidence;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Comparisons;

/// <summary>Tells how two rule sets differ in what they decide and say; places, order and layout of their files do not count.</summary>
internal static class RuleSetComparer
{
    /// <summary>Keys of a rule that neither decide nor say anything in an audit.</summary>
    private static readonly string[] QuietKeys = ["cases", "covers", "formerly"];

    /// <summary>Keys of a quantity that decide its value.</summary>
    private static readonly string[] QuantityKeys = ["formula", "unit", "gives"];

    /// <summary>Compares the rule sets of two revisions.</summary>
    /// <param name="before">The earlier revision.</param>
    /// <param name="after">The later revision.</param>
    /// <param name="names">Which rule is which.</param>
    public static RuleSetChange Compare(Revision before, Revision after, RuleNames names)
    {
        var isSame = before.Rules.Sha256 == after.Rules.Sha256;
        var bothAtHand = before.Audit is not null && after.Audit is not null;
        if (isSame)
        {
            return new RuleSetChange(true, true, []);
        }

        var changes = Parameters(before.Rules, after.Rules).Concat(Rules(before, after, names));
        if (bothAtHand)
        {
            changes = changes.Concat(Quantities(before.Audit!.Rules, after.Audit!.Rules)).Concat(FigureComparer.Compare(before.Audit.Rules.World, after.Audit.Rules.World));
        }

        return new RuleSetChange(false, bothAtHand, [.. changes.OrderBy(change => change.Item).ThenBy(change => change.Name, StringComparer.Ordinal)]);
    }

    /// <summary>Name of a quantity among the changes.</summary>
    public static string NameOf(QuantityDefinition quantity) => $"{quantity.Shape.Name} {quantity.Slot.Symbol}";

    private static IEnumerable<RuleChange> Parameters(RevisionRules before, RevisionRules after)
    {
        foreach (var (one, other) in Joined(before.Parameters, after.Parameters, parameter => parameter.Id))
        {
            if (!Figure.Same(one?.Value, other?.Value))
            {
                var title = other?.About is { Length: > 0 } about ? about : one?.About ?? "";
                yield return new RuleChange(
                    RuleItem.Parameter, (other ?? one)!.Id, title, one is null, other is null,
                    [new RuleDetail("value", one?.Value.Text ?? "", other?.Value.Text ?? "")]);
            }
        }
    }

    private static IEnumerable<RuleChange> Rules(Revision before, Revision after, RuleNames names)
    {
        foreach (var (one, other) in Joined(OfSet(before.Rules), OfSet(after.Rules), rule => names.AfterOf(rule.Id) ?? rule.Id))
        {
            var details = one is null || other is null ? [] : Details(before.Audit?.Rules.Rule(one.Id), after.Audit?.Rules.Rule(other.Id));
            if (one is null || other is null || details.Count > 0)
            {
                yield return new RuleChange(RuleItem.Rule, (other ?? one)!.Id, (other ?? one)!.Title, one is null, other is null, details);
            }
        }
    }

    /// <summary>The rules about the record come with the program, not with a set.</summary>
    private static IEnumerable<RevisionRule> OfSet(RevisionRules rules) =>
        rules.Rules.Where(rule => !rule.Id.StartsWith(RuleHome.RecordPrefix, StringComparison.Ordinal));

    private static IReadOnlyList<RuleDetail> Details(Rule? before, Rule? after) =>
        before is null || after is null
            ? []
            : [.. Joined(before.Node.Entries, after.Node.Entries, entry => entry.Key.Value)
                .Where(pair => !QuietKeys.Contains((pair.One ?? pair.Other)!.Key.Value))
                .Select(pair => new RuleDetail((pair.One ?? pair.Other)!.Key.Value, Flat(pair.One?.Value), Flat(pair.Other?.Value)))
                .Where(detail => detail.Before != detail.After)];

    private static IEnumerable<RuleChange> Quantities(RuleSet before, RuleSet after)
    {
        foreach (var (one, other) in Joined(before.Quantities, after.Quantities, NameOf))
        {
            var details = one is null || other is null ? [] : QuantityKeys
                .Select(key => new RuleDetail(key, Flat(one.Node.Find(key)), Flat(other.Node.Find(key))))
                .Where(detail => detail.Before != detail.After).ToArray();
            if (one is null || other is null || details.Length > 0)
            {
                yield return new RuleChange(RuleItem.Quantity, NameOf((other ?? one)!), (other ?? one)!.Name, one is null, other is null, details);
            }
        }
    }

    /// <summary>Each thing of either list with its namesake in the other, in the order of their names.</summary>
    internal static IEnumerable<(T? One, T? Other)> Joined<T>(IEnumerable<T> before, IEnumerable<T> after, Func<T, string> name)
        where T : class
    {
        var ones = before.ToDictionary(name, StringComparer.Ordinal);
        var others = after.ToDictionary(name, StringComparer.Ordinal);
        return ones.Keys.Union(others.Keys, StringComparer.Ordinal).Order(StringComparer.Ordinal)
            .Select(key => (ones.GetValueOrDefault(key), others.GetValueOrDefault(key)));
    }

    /// <summary>A node as one line; two nodes that say the same have the same, however they are written.</summary>
    private static string Flat(Node? node) => node switch
    {
        ScalarNode scalar => NumbersPutIn.OneLine(scalar.Text),
        SequenceNode list => string.Join(", ", list.Items.Select(Flat)),
        MappingNode mapping => string.Join("; ", mapping.Entries.Select(entry => $"{entry.Key.Value}: {Flat(entry.Value)}")),
        _ => "",
    };
}
