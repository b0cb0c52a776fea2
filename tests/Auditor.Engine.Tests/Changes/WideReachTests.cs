using System.Text;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;

namespace Auditor.Engine.Tests.Changes;

/// <summary>An input that thousands of quantities rest on, changed and changed back.</summary>
public class WideReachTests
{
    [Fact]
    public void What_rests_on_a_changed_input_is_computed_anew_however_much_it_is()
    {
        var text = new StringBuilder("design-format: 1\nsupply: { earthing: TN-S, phases: 1, voltage: 230 V, loop-impedance: 0.3 ohm }\nboards:\n  - id: A\n    circuits:\n");
        for (var id = 1; id <= 3000; id++)
        {
            text.Append($"      - {{ id: {id} }}\n");
        }

        using var rules = new TemporaryRules().With("set.yaml", "set: set\ntitle: Set\nuses: { sheets: [sheet.yaml] }\n")
            .WithSheet("sheet.yaml", "circuit Zs Ω = origin.supply.loop_impedance + 1 ohm", "circuit Zd Ω = 2 * Zs");
        var set = rules.LoadSound("set.yaml");
        var design = Small.Build(text.ToString(), set);
        var (first, last) = (design.Find("A/1")!, design.Find("A/3000")!);
        var slot = first.Shape.Quantity("Zd")!.Index;
        var variant = new Variant(new DependencyMap(design), new SubjectInput(design.Installation, design.Installation.Shape.Input("supply.loop_impedance")!));

        Assert.Equal((2.6, 2.6), Read());
        variant.Set(0, Value.Of(0.5));
        Assert.Equal((3.0, 3.0), Read());
        variant.Set(0, Value.Of(0.7));
        Assert.Equal((3.4, 3.4), Read());
        variant.Reset(0);
        Assert.Equal((2.6, 2.6), Read());

        (double, double) Read() => (Math.Round(variant.Of(first).Quantity(slot).Number, 9), Math.Round(variant.Of(last).Quantity(slot).Number, 9));
    }
}
