using Auditor.Engine.Limits;
using Auditor.Reports.Json;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Limits;

/// <summary>Writes limits for programs, as <c>limits.schema.json</c> describes them.</summary>
public static class LimitsJson
{
    private const int Format = 1;

    /// <summary>Writes the file.</summary>
    /// <returns>Indented JSON in UTF-8 without a byte order mark; lines end with LF.</returns>
    public static byte[] Write(LimitResult result) => Invariantly.Make(() => Whole(result));

    private static byte[] Whole(LimitResult result)
    {
        using var stream = new MemoryStream();
        using (var output = new JsonOutput(stream, new Places(result.Design.File)))
        {
            output.Object(null, () =>
            {
                output.Whole("format", Format);
                FileHead.Write(output, result.Design);
                output.Array("limits", result.Inputs, limit => output.Object(null, () => Limit(output, limit)));
            });
        }

        stream.WriteByte((byte)'\n');
        return stream.ToArray();
    }

    private static void Limit(JsonOutput output, InputLimit limit)
    {
        var (input, slot) = (limit.Input, limit.Input.Adjustment.Slot);
        output.Text("subject", input.Subject.Key);
        output.Text("adjustment", input.Adjustment.Id);
        output.Text("input", input.Adjustment.Path);
        output.Text("label", input.Adjustment.Label);
        output.Text("unit", slot.Unit?.Symbol);
        output.Value("stated", input.Stated, slot.Unit);
        output.Value("expected", limit.Expected, slot.Unit);
        output.Array("required", limit.Required, range => Range(output, null, range, limit));
        Range(output, "around", limit.Around, limit);
        Range(output, "advised", limit.Advised, limit);
        Range(output, "guarded", limit.Guarded, limit);
        output.Array("rules", limit.Rules.Where(rule => rule.Kind != LimitKind.NoLimit), rule => output.Object(null, () => Rule(output, rule, limit)));
        output.Texts("noLimit", limit.Rules.Where(rule => rule.Kind == LimitKind.NoLimit).Select(rule => rule.At.Key));
    }

    private static void Range(JsonOutput output, string? name, AllowedRange? range, InputLimit limit)
    {
        if (range is null)
        {
            output.Null(name!);
            return;
        }

        output.Object(name, () =>
        {
            Bound(output, "least", range.Least, limit);
            Bound(output, "most", range.Most, limit);
        });
    }

    private static void Bound(JsonOutput output, string name, LimitBound? bound, InputLimit limit)
    {
        if (bound is null)
        {
            output.Null(name);
            return;
        }

        output.Object(name, () =>
        {
            output.Value("value", bound.Edge.Value, limit.Input.Adjustment.Slot.Unit);
            output.Text("rule", bound.Rule.At.Rule.Id);
            output.Text("subject", bound.Rule.At.Subject.Key);
        });
    }

    private static void Rule(JsonOutput output, RuleLimit rule, InputLimit limit)
    {
        output.Text("rule", rule.At.Rule.Id);
        output.Text("subject", rule.At.Subject.Key);
        output.Text("provision", rule.At.Rule.Provision == Engine.RuleSets.Provision.Requirement ? "requirement" : "recommendation");
        output.Text("kind", Word(rule.Kind));
        output.Array("kept", rule.Kept, kept => output.Object(null, () =>
        {
            Edge(output, "least", kept.Least, limit);
            Edge(output, "most", kept.Most, limit);
        }));
    }

    private static void Edge(JsonOutput output, string name, LimitEdge? edge, InputLimit limit)
    {
        if (edge is null)
        {
            output.Null(name);
            return;
        }

        output.Object(name, () =>
        {
            output.Value("value", edge.Value, limit.Input.Adjustment.Slot.Unit);
            output.Value("beyond", edge.Beyond, limit.Input.Adjustment.Slot.Unit);
            output.Flag("unknownBeyond", edge.IsUnknownBeyond);
            output.Number("margin", edge.Margin);
        });
    }

    private static string Word(LimitKind kind) => kind switch
    {
        LimitKind.Limit => "limit",
        LimitKind.AlwaysFails => "always-fails",
        LimitKind.NotMonotone => "not-monotone",
        _ => "undetermined",
    };
}
