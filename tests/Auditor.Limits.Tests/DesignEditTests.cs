using Auditor.Engine.Adjustments;
using Auditor.Engine.Remedies;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;

namespace Auditor.Limits.Tests;

/// <summary>Changes written into the text of a design, with nothing else touched.</summary>
public class DesignEditTests
{
    private const string Text = """
        design-format: 1
        project: { title: Edits }
        basis: { stage: design, supply-ownership: public, premises: workshop, ambient: 30 °C }
        supply: { earthing: TN-S, phases: 1, voltage: 230 V, loop-impedance: 0.3 ohm, fault-current: 1.6 kA }
        types:
          cables:
            flat: { construction: flat twin and earth, insulation: thermoplastic 70, csa: 2.5 mm², cpc: 1.5 mm² } # said once
        boards:
          - id: A
            defaults: { method: C }
            circuits:
              - id: 1 # the first
                device: { standard: EN 60898, curve: B, rating: 20 A } # as found
                cable: { type: flat, length: "18 m ± 2 m, assumed" }   # to be paced out
                load: { current: 12 A }
              - id: 2
                device:
                  standard: EN 60898
                  curve: B # usual
                  rating: 20 A
                cable:
                  type: flat
                  # measured on the drawing
                  length: 20 m
        """;

    [Fact]
    public void A_value_that_the_subject_states_is_replaced_and_keeps_its_tolerance() =>
        Assert.Equal(
            Text.Replace("\"18 m ± 2 m, assumed\"", "12.5 m ± 2 m", StringComparison.Ordinal),
            Edited(Text, ("A/1/leg 1", "length", Value.Of(12.5))));

    [Fact]
    public void A_value_from_a_named_type_is_put_in_at_the_subject_alone() =>
        Assert.Equal(
            Text.Replace("assumed\" }   # to", "assumed\", csa: 4 mm², cpc: 1.5 mm² }   # to", StringComparison.Ordinal),
            Edited(Text, ("A/1/leg 1", "csa", Value.Of(4e-6)), ("A/1/leg 1", "cpc", Value.Of(1.5e-6))));

    [Fact]
    public void A_value_from_the_defaults_of_the_board_is_put_in_at_the_subject_alone() =>
        Assert.Equal(
            Text.Replace("          length: 20 m", "          length: 20 m\n          method: E", StringComparison.Ordinal),
            Edited(Text, ("A/2/leg 1", "method", Value.Of("E"))));

    [Fact]
    public void A_missing_group_is_put_in_as_a_whole() =>
        Assert.Equal(
            Text.Replace("12 A }", "12 A }\n        rcd: { residual-current: 30 mA, type: A }", StringComparison.Ordinal),
            Edited(Text, ("A/1", "rcd.residual-current", Value.Of(0.03)), ("A/1", "rcd.type", Value.Of("A"))));

    [Fact]
    public void Comments_and_line_ends_stay() =>
        Assert.Equal(
            Text.Replace("\n", "\r\n", StringComparison.Ordinal).Replace("curve: B # usual", "curve: C # usual", StringComparison.Ordinal)
                .Replace("length: 20 m", "length: 20 m\r\n          csa: 4 mm²", StringComparison.Ordinal),
            Edited(Text.Replace("\n", "\r\n", StringComparison.Ordinal), ("A/2", "device.curve", Value.Of("C")), ("A/2/leg 1", "csa", Value.Of(4e-6))));

    private static string Edited(string text, params (string Subject, string Path, Value Value)[] changes)
    {
        var design = Plan.Build(Shipped.UnitedKingdom, text);
        var edits = DesignEdits.Of(design, [.. changes.Select(change => new ChangedInput(Input(design, change.Subject, change.Path), change.Value))]);
        return Assert.Single(edits).After;
    }

    private static SubjectInput Input(Engine.Installation.Design design, string key, string path)
    {
        var subject = design.Find(key)!;
        return new SubjectInput(subject, subject.Shape.Inputs.Single(slot => slot.Path == path));
    }
}
