using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Json;
using Auditor.Reports.Model;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Sarif;

/// <summary>Writes one audit as one run.</summary>
/// <param name="output">Where to write.</param>
/// <param name="result">The audit.</param>
/// <param name="baseline">How findings stand against an earlier audit; null where nothing was compared.</param>
internal sealed class RunSarif(JsonOutput output, AuditResult result, IReadOnlyDictionary<string, SarifBaseline>? baseline)
{
    private readonly Rule[] _rules = [.. result.Findings.Select(finding => finding.Rule).Distinct().OrderBy(rule => rule.Id, StringComparer.Ordinal)];

    public void Write()
    {
        var places = new PlaceSarif(output, result);
        output.Object("tool", () => output.Object("driver", Driver));
        output.Array("invocations", [result.Rules.Title], title => output.Object(null, () => Invocation(title)));
        output.Text("language", "en-GB");
        output.Object("automationDetails", () => output.Text("id", $"{ThisTool.Name}/{output.Places.Design}/"));
        output.Object("originalUriBaseIds", () => output.Object(PlaceSarif.Base, () => output.Message("description", "The folder of the design file.")));
        places.Artifacts();
        places.Subjects();
        Results(places);
        output.Text("defaultEncoding", "utf-8");
        output.Text("defaultSourceLanguage", "yaml");
        output.Text("columnKind", "utf16CodeUnits");
        output.Object("properties", Properties);
    }

    private void Driver()
    {
        output.Text("name", ThisTool.Name);
        output.Text("version", ThisTool.Version);
        output.Text("semanticVersion", ThisTool.Version);
        output.Text("language", "en-GB");
        output.Array("rules", _rules, rule => output.Object(null, () => RuleSarif.Write(output, rule)));
    }

    private void Invocation(RuleSetTitle title)
    {
        (string Level, string Text)[] notices = [("warning", Loosened.Text(result.Rules)), ("note", title.Notice), ("note", Caution.Text)];
        output.Flag("executionSuccessful", true);
        output.Array("toolConfigurationNotifications", notices.Where(notice => notice.Text.Length > 0), notice => output.Object(null, () =>
        {
            output.Text("level", notice.Level);
            output.Message("message", notice.Text);
        }));
    }

    private void Results(PlaceSarif places)
    {
        var writer = new ResultSarif(output, places, new Supports(result), baseline);
        var indices = _rules.Index().ToDictionary(pair => pair.Item, pair => pair.Index);
        output.Array("results", result.Findings.Where(finding => finding.Verdict != Verdict.Conforms), finding =>
            output.Object(null, () => writer.Write(finding, indices[finding.Rule])));
    }

    private void Properties()
    {
        var said = ProjectWords.Of(result.Design);
        output.TextIfAny("title", said("title"));
        output.TextIfAny("reference", said("reference"));
        output.TextIfAny("revision", said("revision"));
        output.TextIfAny("asOf", result.AsOf is { } day ? DayText.Of(day) : null);
        output.Object("ruleSet", () =>
        {
            output.Text("name", result.Rules.Title.Id);
            output.Text("title", result.Rules.Title.Text);
            output.TextIfAny("edition", result.Rules.Title.Edition);
            output.Text("sha256", result.Rules.Title.Sha256);
        });
        output.Object("counts", () =>
        {
            foreach (var verdict in Enum.GetValues<Verdict>())
            {
                output.Whole(verdict.Word(), result.Count(verdict));
            }
        });
    }
}
