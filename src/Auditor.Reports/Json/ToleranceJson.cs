using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Variation;

namespace Auditor.Reports.Json;

/// <summary>Writes what tolerances make of a finding.</summary>
internal static class ToleranceJson
{
    public static void Write(JsonOutput output, Finding finding)
    {
        if (finding.WorstCase is not { } worst)
        {
            output.Null("withinTolerances");
        }
        else
        {
            Write(output, worst, finding.Share);
        }
    }

    private static void Write(JsonOutput output, WorstCase worst, SampleShare? share) => output.Object("withinTolerances", () =>
    {
        output.Text("verdict", worst.Judgement.Verdict?.Word());
        output.Flag("searched", worst.WasSearched);
        output.Array("corner", worst.Corner, value => output.Object(null, () =>
        {
            Input(output, value.Input.Input);
            output.Number("value", value.Input.Input.Slot.Unit!.FromCoherent(value.Number));
            output.Text("unit", value.Input.Input.Slot.Unit.Symbol);
        }));
        output.Array("effects", worst.Effects, effect => output.Object(null, () => Effect(output, effect)));
        Samples(output, share);
    });

    private static void Input(JsonOutput output, SubjectInput input)
    {
        output.Text("subject", input.Subject.Key);
        output.Text("input", input.Slot.Path);
    }

    private static void Effect(JsonOutput output, InputEffect effect)
    {
        Input(output, effect.Input.Input);
        output.Text("tolerance", effect.Input.Kind == ToleranceKind.Stated ? "stated" : "instrument");
        output.Number("loss", effect.Loss);
        output.Flag("monotone", effect.IsMonotone);
    }

    private static void Samples(JsonOutput output, SampleShare? share)
    {
        if (share is null)
        {
            output.Null("samples");
            return;
        }

        output.Object("samples", () =>
        {
            output.Whole("drawn", share.Samples);
            output.Whole("kept", share.Kept);
            output.Number("share", share.Share);
            output.Number("standardError", share.StandardError);
        });
    }
}
