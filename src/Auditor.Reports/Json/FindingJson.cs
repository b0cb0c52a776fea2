using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Engine.Remedies;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Values;
using Auditor.Quantities;
using Auditor.Reports.Reading;
using Auditor.Reports.Remedies;

namespace Auditor.Reports.Json;

/// <summary>Writes the findings of a findings file.</summary>
internal static class FindingJson
{
    private static readonly Unit Kelvin = UnitCatalog.Find("K")!;

    public static void Write(JsonOutput output, AuditResult result, Supports supports)
    {
        var departures = result.Departures.Select((departure, index) => (departure, index)).ToArray();
        output.Array("findings", result.Findings, finding => output.Object(null, () =>
        {
            Subject(output, finding);
            Clause(output, finding.Rule.Clause);
            Figures(output, finding);
            output.Text("message", finding.Message);
            output.Array("restsOn", supports.Of(finding), foundation => output.Object(null, () => Support(output, foundation)));
            Gaps(output, finding.Judgement.Absences, finding.Subject.Key);
            if (finding.Departure is { } accepted)
            {
                output.Whole("departure", System.Array.Find(departures, pair => ReferenceEquals(pair.departure, accepted)).index);
            }
            else
            {
                output.Null("departure");
            }

            Remedy(output, result.Remedies?.Of(finding.Key));
            output.Location(finding.Location);
        }));
    }

    /// <summary>Only a run that sought remedies says anything of them.</summary>
    private static void Remedy(JsonOutput output, FindingRemedies? each)
    {
        if (each is { Remedies: [var nearest, ..] })
        {
            output.Object("remedy", () => RemediesJson.Remedy(output, nearest));
        }
        else if (each is not null)
        {
            output.Null("remedy");
        }
    }

    public static void Clause(JsonOutput output, Clause clause) => output.Object("clause", () =>
    {
        output.Text("type", clause.Type);
        output.Texts("references", clause.References);
        output.TextOrNull("note", clause.Note);
    });

    /// <summary>What would have to be known. Rule data that lack something lack it for the subject that asked.</summary>
    public static void Gaps(JsonOutput output, Absences? absences, string asking) =>
        output.Array("missing", absences?.Items ?? [], absence => output.Object(null, () =>
        {
            output.Text("subject", absence.Subject.Length == 0 ? asking : absence.Subject);
            output.Text("name", absence.Name);
            output.Text("reason", absence.Help.Length == 0 ? absence.Why : $"{absence.Why}; {absence.Help}");
        }));

    private static void Subject(JsonOutput output, Finding finding)
    {
        output.Text("key", finding.Key);
        output.Text("rule", finding.Rule.Id);
        output.Text("title", finding.Rule.Title);
        output.Text("subject", finding.Subject.Key);
        output.Text("verdict", finding.Verdict.Word());
        output.Flag("onAssumption", finding.OnAssumption);
        output.Text("provision", finding.Rule.Provision.Word());
    }

    private static void Figures(JsonOutput output, Finding finding)
    {
        var check = finding.Rule.Check;
        var judgement = finding.Judgement;
        var compares = check.How != CheckKind.Require;
        if (compares && !judgement.Value.IsMissing)
        {
            output.Object("value", () => Figure(output, judgement.Value, check.Unit));
        }
        else
        {
            output.Null("value");
        }

        if (compares && judgement.Limits.Count > 0 && judgement.Limits.All(limit => !limit.IsMissing))
        {
            output.Object("limit", () => Limit(output, check, judgement));
        }
        else
        {
            output.Null("limit");
        }

        output.Object("margin", () => Margin(output, finding, check.Unit));
        ToleranceJson.Write(output, finding);
    }

    private static void Figure(JsonOutput output, in Value value, Unit? unit)
    {
        output.Value("value", value, unit);
        output.Text("unit", unit?.Symbol);
    }

    private static void Limit(JsonOutput output, Check check, Judgement judgement)
    {
        output.Text("relation", Relation(check.How));
        if (check.How == CheckKind.OneOf)
        {
            output.Array("value", judgement.Limits, limit => output.Value(null, limit, check.Unit));
        }
        else
        {
            output.Value("value", judgement.Limits[0], check.Unit);
        }

        output.Number("to", check.How == CheckKind.Within ? check.Unit!.FromCoherent(judgement.Limits[1].Number) : null);
        output.Text("unit", check.Unit?.Symbol);
    }

    private static void Margin(JsonOutput output, Finding finding, Unit? unit)
    {
        var margin = finding.Judgement.Margin;
        // The distance between two temperatures is a difference.
        var distance = unit is { Dimension.IsTemperature: true } ? Kelvin : unit;
        output.Number("relative", margin?.Relative);
        output.Number("absolute", margin is null ? null : distance!.FromCoherent(margin.Absolute));
        output.Text("unit", margin is null ? null : distance!.Symbol);
        output.Number("worstCase", finding.WorstCase?.Margin?.Relative);
    }

    private static string Relation(CheckKind how) => how switch
    {
        CheckKind.AtMost => "at-most",
        CheckKind.AtLeast => "at-least",
        CheckKind.Within => "within",
        CheckKind.Equal => "equals",
        _ => "one-of",
    };

    private static void Support(JsonOutput output, Foundation foundation)
    {
        output.Text("kind", foundation.Kind == FoundationKind.AssumedInput ? "assumption" : "memory");
        output.Text("subject", foundation.Subject);
        output.Text("name", foundation.Name);
        output.Text("text", foundation.Text);
    }
}
