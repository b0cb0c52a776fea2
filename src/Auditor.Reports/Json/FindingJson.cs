using Auditor.Engine.Evaluation;
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

    /// <summary>So many findings are written by one thread at a stretch.</summary>
    private const int PartSize = 1000;

    /// <summary>So many parts are held as text at once.</summary>
    private const int PartsAtOnce = 8;

    public static void Write(JsonOutput output, AuditResult result)
    {
        var rests = new RestingOn(result, PartSize);
        var gatherers = Enumerable.Range(0, PartsAtOnce).Select(_ => new JsonOutput(null, output.Places)).ToArray();
        output.Gathered("findings", Enumerable.Range(0, result.Findings.Count).Chunk(PartSize * PartsAtOnce).SelectMany(chunk =>
            InParts.Make(chunk.Length, PartSize, range => Part(gatherers[range.Start.Value / PartSize], result, rests, chunk[range]))));
        output.Records("foundations", rests.Foundations, foundation => Support(output, foundation));
        Array.ForEach(gatherers, gatherer => gatherer.Dispose());
    }

    /// <summary>The rules that applied: what findings share is said once.</summary>
    public static void Rules(JsonOutput output, AuditResult result) =>
        output.Records("rules", result.Findings.Select(finding => finding.Rule).Distinct().OrderBy(rule => rule.Id, StringComparer.Ordinal), rule =>
        {
            output.Text("id", rule.Id);
            output.Text("title", rule.Title);
            output.Text("provision", rule.Provision.Word());
            Clause(output, rule.Clause);
        });

    private static JsonOutput Part(JsonOutput gatherer, AuditResult result, RestingOn rests, int[] numbers)
    {
        gatherer.Clear();
        foreach (var number in numbers)
        {
            gatherer.Record(null, () => One(gatherer, result, result.Findings[number], rests.Of(number)));
        }

        return gatherer;
    }

    private static void One(JsonOutput output, AuditResult result, Finding finding, IReadOnlyList<int> restsOn)
    {
        Subject(output, finding);
        Figures(output, finding);
        output.Text("message", finding.Message);
        output.Wholes("restsOn", restsOn);
        Gaps(output, finding.Judgement.Absences, finding.Subject.Key);
        output.WholeOrNull("departure", finding.Departure is { } accepted ? result.Departures.Index().First(entry => ReferenceEquals(entry.Item, accepted)).Index : null);
        Remedy(output, result.Remedies?.Of(finding.Key));
        output.Location(finding.Location);
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
        output.Array("missing", absences?.Items ?? [], absence =>
        {
            output.Start(null);
            output.Text("subject", absence.Subject.Length == 0 ? asking : absence.Subject);
            output.Text("name", absence.Name);
            output.Text("reason", absence.Help.Length == 0 ? absence.Why : $"{absence.Why}; {absence.Help}");
            output.End();
        });

    private static void Subject(JsonOutput output, Finding finding)
    {
        output.Text("key", finding.Key);
        output.Text("rule", finding.Rule.Id);
        output.Text("subject", finding.Subject.Key);
        output.Text("verdict", finding.Verdict.Word());
        output.Flag("onAssumption", finding.OnAssumption);
    }

    private static void Figures(JsonOutput output, Finding finding)
    {
        var check = finding.Rule.Check;
        var judgement = finding.Judgement;
        var compares = check.How != CheckKind.Require;
        if (compares && !judgement.Value.IsMissing)
        {
            output.Start("value");
            output.Value("value", judgement.Value, check.Unit);
            output.Text("unit", check.Unit?.Symbol);
            output.End();
        }
        else
        {
            output.Null("value");
        }

        if (compares && judgement.Limits.Count > 0 && judgement.Limits.All(limit => !limit.IsMissing))
        {
            output.Start("limit");
            Limit(output, check, judgement);
            output.End();
        }
        else
        {
            output.Null("limit");
        }

        Margin(output, finding, check.Unit);
        ToleranceJson.Write(output, finding);
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
        if (margin is null && finding.WorstCase?.Margin is null)
        {
            output.Null("margin");
            return;
        }

        // The distance between two temperatures is a difference.
        var distance = unit is { Dimension.IsTemperature: true } ? Kelvin : unit;
        output.Start("margin");
        output.Number("relative", margin?.Relative);
        output.Number("absolute", margin is null ? null : distance!.FromCoherent(margin.Absolute));
        output.Text("unit", margin is null ? null : distance!.Symbol);
        output.Number("worstCase", finding.WorstCase?.Margin?.Relative);
        output.End();
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
