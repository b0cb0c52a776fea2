using System.Globalization;
using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Departures;

/// <summary>Reads the departures of a design, says what became of each, and puts those in force to the findings that they accept.</summary>
/// <param name="rules">The rule set.</param>
/// <param name="asOf">The day of the audit.</param>
/// <param name="problems">Receives dates that are none.</param>
internal sealed class DepartureReader(RuleSet rules, DateOnly asOf, Problems problems)
{
    /// <summary>The departures of a design, in its order.</summary>
    /// <param name="file">The design.</param>
    /// <param name="findings">What the audit found; a finding that a departure accepts is replaced, by the first that accepts it.</param>
    public IReadOnlyList<Departure> Read(DesignFile file, List<Finding> findings)
    {
        var stated = file.Root.Mappings("departures").ToArray();
        if (stated.Length == 0)
        {
            return [];
        }

        var byRule = findings.Index().ToLookup(entry => entry.Item.Rule.Id, entry => entry.Index, StringComparer.Ordinal);
        return [.. stated.Select(node => Read(node, byRule, findings)).OfType<Departure>()];
    }

    private Departure? Read(MappingNode node, ILookup<string, int> byRule, List<Finding> findings)
    {
        var date = DateOf(node.Scalar("date"));
        var until = DateOf(node.Scalar("until"));
        if (date is null || (until is null && node.Find("until") is not null))
        {
            return null;
        }

        if (until < date)
        {
            problems.Add(DesignMessages.EndsBeforeItBegins(node.Find("until")!.Span, node.Find("date")!.Span));
            return null;
        }

        var (named, subject) = (node.Text("rule")!, node.Text("subject")!);
        var rule = rules.Rule(named);
        var pattern = new SubjectPattern(subject);
        int[] places = rule is null ? [] : [.. byRule[rule.Id].Where(place => pattern.Fits(findings[place].Subject.Key))];
        var state = StateOf(rule, until, [.. places.Select(place => findings[place])]);
        var departure = new Departure(named, subject, node.Text("reason")!, node.Text("agreed-by")!, date.Value, until, state, node);
        foreach (var place in places.Where(place => state == DepartureState.InForce && findings[place].Verdict is Verdict.Nonconforming or Verdict.Unproven))
        {
            findings[place] = findings[place].With(departure);
        }

        return departure;
    }

    private DepartureState StateOf(Rule? rule, DateOnly? until, Finding[] findings)
    {
        if (rule is { AllowsDepartures: false })
        {
            return DepartureState.Forbidden;
        }

        if (findings.Length == 0)
        {
            return DepartureState.Unmatched;
        }

        if (until < asOf)
        {
            return DepartureState.Expired;
        }

        return Array.Exists(findings, IsAcceptable) ? DepartureState.InForce : DepartureState.NotNeeded;
    }

    /// <summary>Whether a finding tells of something that a departure can accept, or that one has accepted already.</summary>
    private static bool IsAcceptable(Finding finding) => finding.Verdict is Verdict.Nonconforming or Verdict.Unproven or Verdict.Departed;

    private DateOnly? DateOf(ScalarNode? scalar)
    {
        if (scalar is null)
        {
            return null;
        }

        if (DateOnly.TryParseExact(scalar.Text, "yyyy-MM-dd", CultureInfo.InvariantCulture, DateTimeStyles.None, out var date))
        {
            return date;
        }

        problems.Add(DesignMessages.NoDate(scalar.Span, scalar.Text));
        return null;
    }
}
