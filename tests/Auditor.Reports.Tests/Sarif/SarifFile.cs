using System.Text.Json.Nodes;
using Auditor.Engine.Findings;
using Auditor.Reports.Sarif;

namespace Auditor.Reports.Tests.Sarif;

/// <summary>A SARIF file as a program reads it.</summary>
internal sealed class SarifFile(AuditResult result, IReadOnlyDictionary<string, SarifBaseline>? baseline = null)
{
    public JsonNode Root { get; } = JsonNode.Parse(SarifReport.Write(result, baseline))!;

    public JsonNode Run => Root["runs"]![0]!;

    public JsonArray Rules => Run["tool"]!["driver"]!["rules"]!.AsArray();

    public JsonNode[] Results => [.. Run["results"]!.AsArray().Select(result => result!)];

    /// <summary>The result of a finding.</summary>
    public JsonNode Result(string key) => Results.Single(result => Fingerprint(result) == key);

    public static string Fingerprint(JsonNode result) => result["partialFingerprints"]!.AsObject().Single().Value!.GetValue<string>();
}
