using System.Globalization;
using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Engine.Departures;

/// <summary>Reads the departures of a design and says what became of each.</summary>
/// <param name="rules">The rule set.</param>
/// <param name="asOf">The day of the audit.</param>
/// <param name="problems">Receives dates that are none.</param>
public sealed class DepartureReader(RuleSet rules, DateOnly asOf, Problems problems)
{
    /// <summary>The departures of a design, in its order.</summary>
    public IReadOnlyList<Departure> Read(DesignFile file, IReadOnlyDictionary<string, Finding> findings) =>
        [.. file.Root.Mappings("departures").Select(node => Read(node, findings)).OfType<Departure>()];

    /// <summary>The key of the finding that a departure speaks of; null when there is no such rule.</summary>
    public string? KeyOf(string rule, string subject) => rules.Rule(rule) is { } known ? $"{known.Id}:{subject}" : null;

    private Departure? Read(MappingNode node, IReadOnlyDictionary<string, Finding> findings)
    {
        var rule = node.Scalar("rule")!;
        var subject = node.Text("subject")!;
        var date = DateOf(node.Scalar("date"));
        var expires = DateOf(node.Scalar("expires"));
        if (date is null || (expires is null && node.Find("expires") is not null))
        {
            return null;
        }

        var finding = KeyOf(rule.Text, subject) is { } key ? findings.GetValueOrDefault(key) : null;
        return new Departure(
            rule.Text, subject, node.Text("reason")!, node.Text("agreed-by")!, date.Value, expires, StateOf(finding, expires), rule.Span);
    }

    private DepartureState StateOf(Finding? finding, DateOnly? expires) => finding switch
    {
        null => DepartureState.Unmatched,
        { Rule.AllowsDepartures: false } => DepartureState.Refused,
        _ when expires < asOf => DepartureState.Expired,
        { Verdict: Verdict.Nonconforming or Verdict.Unproven } => DepartureState.InForce,
        _ => DepartureState.NotNeeded,
    };

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
