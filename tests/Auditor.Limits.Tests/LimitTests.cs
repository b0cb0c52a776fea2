using Auditor.Engine.Adjustments;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.Limits;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;
using Auditor.Quantities;
using CsCheck;

namespace Auditor.Limits.Tests;

/// <summary>Limits, put into the design that they were found for.</summary>
public class LimitTests
{
    [Fact]
    public void A_limit_put_into_the_design_leaves_no_margin_and_across_it_the_verdict_turns() =>
        Plans.Any.Sample(plan =>
        {
            var design = plan.Build(Shipped.UnitedKingdom);
            var tried = 0;
            foreach (var limit in LimitSearch.Run(design, Adjustables.WithLimits(design)).Inputs.Where(limit => limit.Input.Adjustment.Ladder is RangeLadder))
            {
                foreach (var (rule, edge) in EdgesOf(limit).Where(pair => !pair.Edge.IsUnknownBeyond && Math.Abs(pair.Edge.Margin) < 1e-6))
                {
                    var unit = limit.Input.Adjustment.Slot.Unit!;
                    var inside = At(plan, limit, edge.Value.Number, unit).Judge(rule);
                    var outside = At(plan, limit, edge.Beyond.Number, unit).Judge(rule);
                    // Where another limit lies at the same place, the rule may apply no longer.
                    Assert.True(inside.Verdict is null or Verdict.Conforms, $"{limit.Input.Adjustment.Id} {rule.At.Key} at {edge}: {inside}");
                    Assert.InRange(inside.Margin?.Relative ?? inside.Margin?.Absolute ?? 0, -1e-6, 1e-6);
                    Assert.True(outside.Verdict is Verdict.Nonconforming, $"{limit.Input.Adjustment.Id} {rule.At.Key} beyond {edge}: {outside}");
                    Assert.True(outside.Margin!.Absolute < 0);
                    tried++;
                }
            }

            Assert.True(tried > 5, $"{tried} limits tried");
        }, iter: 8, threads: 1);

    [Fact]
    public void Where_a_margin_jumps_the_rule_is_kept_on_the_one_side_only() =>
        Plans.Any.Sample(plan =>
        {
            var design = plan.Build(Shipped.UnitedKingdom);
            foreach (var limit in LimitSearch.Run(design, Adjustables.WithLimits(design)).Inputs)
            {
                foreach (var (rule, edge) in EdgesOf(limit).Where(pair => !pair.Edge.IsUnknownBeyond && Math.Abs(pair.Edge.Margin) >= 1e-6))
                {
                    var adjusted = new AdjustedDesign(new DependencyMap(design), limit.Input);
                    adjusted.Set(edge.Value);
                    Assert.True(adjusted.Judge(rule.At).Verdict is null or Verdict.Conforms);
                    adjusted.Set(edge.Beyond);
                    Assert.Equal(Verdict.Nonconforming, adjusted.Judge(rule.At).Verdict);
                }
            }
        }, iter: 4, threads: 1);

    [Fact]
    public void A_rule_without_a_limit_is_kept_wherever_it_is_tried() =>
        Gen.Select(Plans.Any, Gen.Double[0, 1].Array[20]).Sample((plan, shares) =>
        {
            var design = plan.Build(Shipped.UnitedKingdom);
            foreach (var limit in LimitSearch.Run(design, Adjustables.WithLimits(design)).Inputs)
            {
                if (limit.Input.Adjustment.Ladder is not RangeLadder range)
                {
                    continue;
                }

                var adjusted = new AdjustedDesign(new DependencyMap(design), limit.Input);
                foreach (var share in shares)
                {
                    adjusted.Set(Value.Of(range.From * Math.Pow(Math.Max(1, range.To / Math.Abs(range.From)), share)));
                    Assert.All(limit.Rules.Where(rule => rule.Kind == LimitKind.NoLimit), rule => Assert.True(adjusted.Judge(rule.At).Verdict is null or Verdict.Conforms));
                    Assert.All(limit.Rules.Where(rule => rule.Kind == LimitKind.AlwaysFails), rule => Assert.False(adjusted.Judge(rule.At).Verdict is Verdict.Conforms));
                }
            }
        }, iter: 3, threads: 1);

    [Fact]
    public void The_rule_that_bites_first_governs()
    {
        // 2.5 mm² flat cable, 12 A on a B20: voltage drop, 5 % of 230 V at 18 mV/A/m, ends at 53.2 m; disconnection, 2.185 ohm less 0.3 ohm at 23.41 mohm/m, at 80.5 m.
        var limit = Find(Plans.Fixed, "MB/2", "cable-length");

        Assert.Equal("voltage-drop-other", limit.Around!.Most!.Rule.At.Rule.Id);
        Assert.Equal(53.24, limit.Around.Most.Edge.Value.Number, 0.01);
        var disconnection = limit.Rules.Single(rule => rule.At.Key == "disconnection-tn:MB/2");
        Assert.Equal(LimitKind.Limit, disconnection.Kind);
        Assert.Equal(80.52, disconnection.Kept[0].Most!.Value.Number, 0.05);
        Assert.Null(disconnection.Kept[0].Least);
    }

    [Fact]
    public void The_load_of_a_circuit_is_bounded_by_the_device_before_it()
    {
        var limit = Find(Plans.Fixed, "MB/2", "load-current");

        Assert.Equal(20, limit.Around!.Most!.Edge.Value.Number, 9);
        Assert.Equal("overload-design-current", limit.Around.Most.Rule.At.Rule.Id);
    }

    [Fact]
    public void Conductor_sizes_are_tried_step_by_step_and_the_least_that_carries_the_load_is_found()
    {
        // A B20 needs Iz of 20 A; two circuits bunched (0.8) ask for 25 A of method C: 2.5 mm² has 27 A, 1.5 mm² has 20 A.
        var limit = Find(Plans.Fixed.With("MB/2/leg 1", "grouped-circuits", "2"), "MB/2", "cable-size");
        var capacity = limit.Rules.Single(rule => rule.At.Key == "overload-capacity:MB/2");

        Assert.Equal(2.5e-6, capacity.Kept[0].Least!.Value.Number, 1e-12);
        Assert.Equal(1.5e-6, capacity.Kept[0].Least!.Beyond.Number, 1e-12);
    }

    [Fact]
    public void The_protective_conductor_of_a_flat_cable_goes_with_its_size()
    {
        var design = Plans.Fixed.Build(Shipped.UnitedKingdom);
        var input = Adjustables.WithLimits(design).Single(place => place.Subject.Key == "MB/2" && place.Adjustment.Id == "cable-size");
        var adjusted = new AdjustedDesign(new DependencyMap(design), input);
        adjusted.Set(Value.Of(6e-6));

        // R1+R2 of 6/2.5 mm² flat cable: 3.08 + 7.41 mohm/m over 20 m at 70 °C, and 0.3 ohm before it.
        Assert.Equal(0.3 + (0.01049 * 20 * 1.2), adjusted.Judge(new RuleAt(Shipped.UnitedKingdom.Rule("disconnection-tn")!, design.Find("MB/2")!)).Value.Number, 1e-4);
    }

    [Fact]
    public void A_reading_has_a_limit_before_it_is_taken_and_a_closer_one_for_its_instrument()
    {
        // B32 ring with an RCD of the fixed plan is cleared by its breaker: 0.8 × 0.95 × 230 V / 160 A = 1.0925 ohm; with 30 % of uncertainty 0.8404 ohm.
        var limit = Find(Plans.Fixed, "MB/1", "reading-loop");

        Assert.True(limit.Input.Stated.IsMissing);
        Assert.Equal(1.0925, limit.Around!.Most!.Edge.Value.Number, 1e-4);
        Assert.Equal("loop-reading-cold", limit.Around.Most.Rule.At.Rule.Id);
        Assert.Equal(1.0925 / 1.3, limit.Guarded!.Most!.Edge.Value.Number, 1e-4);
    }

    [Fact]
    public void A_rule_that_no_value_helps_is_told_as_such()
    {
        // 900 m of 25 mm² use up the voltage drop before the sub-board; no length after it is short enough.
        var limit = Find(Plans.Fixed.With("MB/F/leg 1", "length", "900 m"), "SB/1", "cable-length");

        Assert.Equal(LimitKind.AlwaysFails, limit.Rules.Single(rule => rule.At.Key == "voltage-drop-other:SB/1").Kind);
    }

    [Fact]
    public void A_window_between_two_failures_has_both_ends_and_two_windows_are_not_monotone()
    {
        var reading = Find(Plans.Fixed, "MB/2", "reading-continuity").Rules.Single(rule => rule.At.Rule.Id == "continuity-reading-prediction");

        Assert.Equal(LimitKind.Limit, reading.Kind);
        // Predicted at 10 °C: 20 m of 19.51 mohm/m times 0.96, and 20 % either way.
        Assert.Equal(0.8 * 0.37459, reading.Kept[0].Least!.Value.Number, 1e-4);
        Assert.Equal(1.2 * 0.37459, reading.Kept[0].Most!.Value.Number, 1e-4);
    }

    private static IEnumerable<(RuleLimit Rule, LimitEdge Edge)> EdgesOf(InputLimit limit) =>
        limit.Rules.SelectMany(rule => rule.Kept.SelectMany(kept => new[] { kept.Least, kept.Most }).OfType<LimitEdge>().Select(edge => (rule, edge)));

    private static InputLimit Find(Plan plan, string subject, string adjustment)
    {
        var design = plan.Build(Shipped.UnitedKingdom);
        var input = Adjustables.WithLimits(design).Single(place => place.Subject.Key == subject && place.Adjustment.Id == adjustment);
        return LimitSearch.Run(design, [input]).Inputs[0];
    }

    /// <summary>The design built anew with one input at a value.</summary>
    private static Rebuilt At(Plan plan, InputLimit limit, double number, Unit unit)
    {
        var text = QuantityText.Write(new StatedQuantity(new Quantity(number, unit.Dimension), unit, null, Standing.Designed));
        var path = limit.Input.Adjustment.Slot.Path;
        var holder = limit.Input.Holders[0].Key;
        return new Rebuilt(plan.With(holder, path, text).Build(Shipped.UnitedKingdom));
    }

    private sealed record Rebuilt(Design Design)
    {
        public Judgement Judge(RuleLimit rule) => Engine.Evaluation.Judge.Decide(rule.At.Rule, Design.Find(rule.At.Subject.Key)!.Scope);
    }
}
