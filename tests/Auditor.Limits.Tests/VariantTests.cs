using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;
using CsCheck;

namespace Auditor.Limits.Tests;

/// <summary>A variant against the design built anew with the same change.</summary>
public class VariantTests
{
    private static readonly Gen<(string Subject, string Path, string Text)> Change = Gen.OneOf(
        Gen.Double[0.02, 2].Select(ohms => ("-", "supply.loop-impedance", $"{ohms:0.000} ohm")),
        Gen.Double[1, 300].Select(metres => ("MB/F/leg 1", "length", $"{metres:0.0} m")),
        Gen.OneOf("25 mm²", "95 mm²", "120 mm²").Select(size => ("MB/F/leg 1", "csa", size)),
        Gen.Double[1, 200].Select(metres => ("MB/1/leg 1", "length", $"{metres:0.0} m")),
        Gen.Double[1, 40].Select(amperes => ("SB/1", "load.current", $"{amperes:0.0} A")),
        Gen.Int[10, 70].Select(degrees => ("SB/1/leg 1", "ambient", $"{degrees} °C")),
        Gen.OneOf("B", "C", "D").Select(curve => ("SB/1", "device.curve", curve)),
        Gen.OneOf("6 A", "16 A", "32 A").Select(rating => ("MB/1", "device.rating", rating)),
        Gen.Double[0.1, 9].Select(ohms => ("MB/1", "readings.zs", $"{ohms:0.00} ohm")),
        Gen.OneOf("10 mA", "30 mA", "300 mA").Select(current => ("SB/1", "rcd.residual-current", current)));

    [Fact]
    public void A_variant_judges_as_the_design_built_anew_with_the_same_changes() =>
        Gen.Select(Plans.Any, Change, Change).Sample((plan, first, second) =>
        {
            var changes = first.Subject == second.Subject && first.Path == second.Path ? new[] { first } : [first, second];
            var design = plan.Build(Shipped.UnitedKingdom);
            var other = changes.Aggregate(plan, (so, change) => so.With(change.Subject, change.Path, change.Text)).Build(Shipped.UnitedKingdom);
            var inputs = changes.Select(change => Input(design, change.Subject, change.Path)).ToArray();
            var variant = new Variant(new DependencyMap(design), inputs);
            for (var i = 0; i < inputs.Length; i++)
            {
                variant.Set(i, other.Find(inputs[i].Subject.Key)!.Input(inputs[i].Slot.Index));
            }

            foreach (var subject in design.Subjects)
            {
                foreach (var rule in Shipped.UnitedKingdom.RulesOf(subject.Shape))
                {
                    var expected = Judge.Decide(rule, other.Find(subject.Key)!.Scope);
                    AssertSame(expected, variant.Judge(new RuleAt(rule, subject)), $"{rule.Id}:{subject.Key}");
                }
            }
        }, iter: 60);

    [Fact]
    public void Only_rules_within_reach_come_out_otherwise() =>
        Gen.Select(Plans.Any, Change).Sample((plan, change) =>
        {
            var design = plan.Build(Shipped.UnitedKingdom);
            var other = plan.With(change.Subject, change.Path, change.Text).Build(Shipped.UnitedKingdom);
            var reached = new DependencyMap(design).ReachOf(Input(design, change.Subject, change.Path)).Rules.Select(at => at.Key).ToHashSet();
            foreach (var subject in design.Subjects)
            {
                foreach (var rule in Shipped.UnitedKingdom.RulesOf(subject.Shape).Where(rule => !reached.Contains($"{rule.Id}:{subject.Key}")))
                {
                    AssertSame(Judge.Decide(rule, subject.Scope), Judge.Decide(rule, other.Find(subject.Key)!.Scope), $"{rule.Id}:{subject.Key}");
                }
            }
        }, iter: 60);

    [Fact]
    public void A_length_reaches_its_own_circuit_and_nothing_beside_it()
    {
        var design = Plans.Fixed.Build(Shipped.UnitedKingdom);
        var reached = new DependencyMap(design).ReachOf(Input(design, "MB/1/leg 1", "length")).Rules;

        Assert.Contains(reached, at => at.Key == "disconnection-tn:MB/1");
        Assert.DoesNotContain(reached, at => at.Subject.Key.StartsWith("SB", StringComparison.Ordinal));
        Assert.DoesNotContain(reached, at => at.Rule.Id == "disconnection-tn" && at.Subject.Key != "MB/1");
    }

    [Fact]
    public void A_design_is_left_as_it_was()
    {
        var design = Plans.Fixed.Build(Shipped.UnitedKingdom);
        var input = Input(design, "-", "supply.loop-impedance");
        var zs = design.Find("MB/1")!.Shape.Quantity("Zs")!.Index;
        var before = design.Find("MB/1")!.Quantity(zs).Number;
        var variant = new Variant(new DependencyMap(design), input);
        variant.Set(0, Value.Of(5.0));

        Assert.True(variant.Of(design.Find("MB/1")!).Quantity(zs).Number > 5);
        Assert.Equal(before, design.Find("MB/1")!.Quantity(zs).Number);
        variant.Reset(0);
        Assert.Equal(before, variant.Of(design.Find("MB/1")!).Quantity(zs).Number);
    }

    private static SubjectInput Input(Design design, string key, string path)
    {
        var subject = design.Find(key)!;
        return new SubjectInput(subject, subject.Shape.Inputs.Single(slot => slot.Path == path));
    }

    private static void AssertSame(Judgement expected, Judgement actual, string where)
    {
        Assert.True(expected.Verdict == actual.Verdict, $"{where}: {expected.Verdict} and {actual.Verdict}");
        Assert.True(expected.Margin == actual.Margin, $"{where}: {expected.Margin} and {actual.Margin}");
        Assert.True(expected.Marks == actual.Marks, $"{where}: {expected.Marks} and {actual.Marks}");
    }
}
