using Auditor.Engine.Departures;
using Auditor.Engine.Evidence;
using Auditor.Engine.Findings;
using Auditor.Reports.Json;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Sarif;

/// <summary>Writes findings as results.</summary>
/// <param name="output">Where to write.</param>
/// <param name="places">How places are written.</param>
/// <param name="supports">What findings rest on.</param>
/// <param name="baseline">How findings stand against an earlier audit; null where nothing was compared.</param>
internal sealed class ResultSarif(
    JsonOutput output, PlaceSarif places, Supports supports, IReadOnlyDictionary<string, SarifBaseline>? baseline)
{
    /// <summary>Name and version of the way in which a result is known again: by rule and subject, wherever it stands.</summary>
    private const string Fingerprint = "ruleAndSubject/v1";

    public void Write(Finding finding, int ruleIndex)
    {
        var isOpen = finding.Verdict == Verdict.Undetermined;
        output.Text("ruleId", finding.Rule.Id);
        output.Whole("ruleIndex", ruleIndex);
        output.Text("kind", isOpen ? "open" : "fail");
        // A level is for failures only (SARIF 2.1.0, 3.27.10).
        output.Text("level", isOpen ? "none" : RuleSarif.Level(finding.Rule.Provision));
        output.Message("message", Sentence(finding));
        var file = output.Places.Path(finding.Location.Source.Path);
        if (file != output.Places.Design)
        {
            places.Artifact("analysisTarget", output.Places.Design);
        }

        output.Array("locations", [finding.Location], span => output.Object(null, () => places.Location(span, finding.Subject, "")));
        RelatedLocations(finding);
        output.Object("partialFingerprints", () => output.Text(Fingerprint, finding.Key));
        Suppressions(finding.Departure);
        if (baseline is not null)
        {
            output.Text("baselineState", Word(baseline.GetValueOrDefault(finding.Key, SarifBaseline.New)));
        }

        output.Object("properties", () => Properties(finding));
    }

    /// <summary>Readers show it beside the title of the rule, but not the subject.</summary>
    private static string Sentence(Finding finding)
    {
        var missing = finding.Judgement.Absences?.Items ?? [];
        var open = finding.Verdict == Verdict.Undetermined ? $"cannot be judged, as {string.Join("; ", missing)}. " : "";
        return $"{SubjectText.Label(finding.Subject)}: {open}{finding.Message}";
    }

    private void RelatedLocations(Finding finding)
    {
        var assumed = supports.Of(finding).Where(support => support is { Kind: FoundationKind.AssumedInput, Span: not null }).ToArray();
        if (assumed.Length > 0)
        {
            output.Array("relatedLocations", assumed.Index(), pair => output.Object(null, () =>
            {
                output.Whole("id", pair.Index);
                places.Location(pair.Item.Span!.Value, null, $"Assumed: {pair.Item.Subject} {pair.Item.Name}: {pair.Item.Text}");
            }));
        }
    }

    /// <summary>An empty list says that the result is not suppressed; no list would leave it open.</summary>
    private void Suppressions(Departure? departure) =>
        output.Array<Departure>("suppressions", departure is null ? [] : [departure], accepted => output.Object(null, () =>
        {
            output.Text("kind", places.Holds(accepted.Span) ? "inSource" : "external");
            output.Text("status", "accepted");
            output.Text("justification", accepted.Reason);
            output.Object("location", () => places.Location(accepted.Span, null, ""));
            output.Object("properties", () =>
            {
                output.Text("agreedBy", accepted.AgreedBy);
                output.Text("date", DayText.Of(accepted.Date));
                output.TextIfAny("until", accepted.Until is { } day ? DayText.Of(day) : null);
            });
        }));

    private void Properties(Finding finding)
    {
        output.Text("verdict", finding.Verdict.Word());
        output.Text("provision", finding.Rule.Provision.Word());
        output.TextIfAny("value", finding.ValueShown);
        output.TextIfAny("limit", finding.LimitShown);
        output.TextIfAny("margin", finding.Judgement.Margin?.Relative is { } relative ? ValueText.ShowMargin(relative) : null);
        output.TextIfAny("worstMargin", finding.WorstCase?.Margin?.Relative is { } worst ? ValueText.ShowMargin(worst) : null);
        output.Flag("onAssumption", finding.OnAssumption);
        output.Flag("fromMemory", finding.FromMemory);
        output.Texts("missing", (finding.Judgement.Absences?.Items ?? []).Select(absence => absence.ToString()));
    }

    private static string Word(SarifBaseline state) => state switch
    {
        SarifBaseline.New => "new",
        SarifBaseline.Updated => "updated",
        _ => "unchanged",
    };
}
