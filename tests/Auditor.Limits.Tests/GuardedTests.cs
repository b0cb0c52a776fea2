using Auditor.Documents;
using Auditor.Engine.Evaluation;
using Auditor.Engine.Findings;
using Auditor.Engine.Guarded;
using Auditor.Engine.Installation;
using Auditor.Engine.Variation;
using Auditor.Formulas.Values;
using CsCheck;

namespace Auditor.Limits.Tests;

/// <summary>Guarded acceptance: tolerances used up against the design.</summary>
public class GuardedTests
{
    private static readonly DateOnly Day = new(2026, 3, 1);

    [Fact]
    public void The_worst_case_is_never_better_than_any_of_2000_random_points_within_the_tolerances() =>
        Plans.Toleranced.Sample(plan =>
        {
            var design = plan.Build(Shipped.UnitedKingdom);
            var map = new DependencyMap(design);
            var inputs = ToleranceReader.Read(design);
            var cases = GuardedAcceptance.Run(map, inputs);
            var variant = new Variant(map, [.. inputs.Select(input => input.Input)]);
            var random = new Random(5);
            for (var point = 0; point < 2000; point++)
            {
                for (var i = 0; i < inputs.Count; i++)
                {
                    variant.Set(i, Value.Of(inputs[i].Low + (random.NextDouble() * (inputs[i].High - inputs[i].Low))));
                }

                foreach (var (at, worst) in cases)
                {
                    AssertNotBetter(worst.Judgement, variant.Judge(at), at.Key);
                }
            }
        }, iter: 12, threads: 1);

    [Fact]
    public void What_no_tolerance_reaches_has_no_worst_case_and_comes_out_the_same_at_random_points() =>
        Plans.Toleranced.Sample(plan =>
        {
            var design = plan.Build(Shipped.UnitedKingdom);
            var map = new DependencyMap(design);
            var inputs = ToleranceReader.Read(design);
            var cases = GuardedAcceptance.Run(map, inputs);
            var variant = new Variant(map, [.. inputs.Select(input => input.Input)]);
            var random = new Random(9);
            var rest = Audit.Run(design, Day, new Problems()).Findings
                .Where(finding => finding.Verdict == Verdict.Conforms && !cases.ContainsKey(new RuleAt(finding.Rule, finding.Subject))).ToArray();
            for (var point = 0; point < 200; point++)
            {
                for (var i = 0; i < inputs.Count; i++)
                {
                    variant.Set(i, Value.Of(inputs[i].Low + (random.NextDouble() * (inputs[i].High - inputs[i].Low))));
                }

                foreach (var finding in rest)
                {
                    AssertNotBetter(finding.Judgement, variant.Judge(new RuleAt(finding.Rule, finding.Subject)), finding.Key);
                }
            }
        }, iter: 12, threads: 1);

    [Fact]
    public void A_tolerance_that_reaches_past_the_limit_leaves_conformity_unproven()
    {
        // The limit of 16 A type C at Cmin 0.95 is 1.3656 ohm; the loop is 0.3 ohm and 22 m of 2.5/1.5 flat cable at 70 °C, 1.20 times 19.51 mohm/m.
        var guarded = Find(Radial("22 m ± 100 %"), Decision.Guarded, "disconnection-tn:MB/2");
        var simple = Find(Radial("22 m ± 100 %"), Decision.Simple, "disconnection-tn:MB/2");

        Assert.Equal(Verdict.Unproven, guarded.Verdict);
        Assert.Equal("unproven", guarded.VerdictText);
        Assert.Equal(Verdict.Conforms, simple.Verdict);
        // At 44 m: 0.3 + 44 × 0.01951 × 1.2 = 1.3301 ohm with 2.5/1.5 mm²; the margin keeps the limit for C16 but not for C20 (1.0925 ohm).
        Assert.Equal(1 - (1.33013 / 1.0925), guarded.WorstCase!.Margin!.Relative!.Value, 0.001);
        Assert.Equal(1 - (0.81506 / 1.0925), guarded.Judgement.Margin!.Relative!.Value, 0.001);
    }

    [Fact]
    public void A_one_sided_tolerance_counts_on_its_side_only()
    {
        var less = Find(Radial("22 m +0 m -10 m"), Decision.Guarded, "disconnection-tn:MB/2");
        var more = Find(Radial("22 m +3 m -0 m"), Decision.Guarded, "disconnection-tn:MB/2");

        Assert.Null(less.WorstCase);
        Assert.Equal(Verdict.Conforms, less.Verdict);
        // 25 m: 0.3 + 25 × 0.01951 × 1.2 = 0.8853 ohm against 1.0925 ohm.
        Assert.Equal(1 - (0.8853 / 1.0925), more.WorstCase!.Margin!.Relative!.Value, 0.001);
        Assert.Equal([("MB/2/leg 1 length", 25.0)], more.WorstCase.Corner.Select(value => (value.Input.Input.ToString(), value.Number)));
        Assert.False(more.WorstCase.WasSearched);
    }

    [Fact]
    public void A_reading_is_guarded_by_the_uncertainty_of_its_instrument()
    {
        // The limit for a cold reading is 0.8 × 1.0925 = 0.874 ohm for C20; 0.7 ohm and 30 % of it are 0.91 ohm.
        var unproven = Find(Radial("22 m").With("MB/2", "readings.zs", "0.7 ohm"), Decision.Guarded, "loop-reading-cold:MB/2");
        var proven = Find(Radial("22 m").With("MB/2", "readings.zs", "0.67 ohm"), Decision.Guarded, "loop-reading-cold:MB/2");
        var own = Find(Radial("22 m").With("MB/2", "readings.zs", "0.7 ohm ± 0.05 ohm"), Decision.Guarded, "loop-reading-cold:MB/2");

        Assert.Equal(Verdict.Unproven, unproven.Verdict);
        Assert.True(unproven.FromMemory);
        Assert.Equal(Verdict.Conforms, proven.Verdict);
        Assert.Equal(0.67 * 1.3, proven.WorstCase!.Judgement.Value.Number, 9);
        Assert.Equal(Verdict.Conforms, own.Verdict);
        Assert.Equal(0.75, own.WorstCase!.Judgement.Value.Number, 9);
    }

    [Fact]
    public void A_tolerance_goes_no_further_than_the_schema_allows()
    {
        var design = Radial("22 m").With("MB/2", "load.power-factor", "0.98 ± 10 %").Build(Shipped.UnitedKingdom);

        var factor = Assert.Single(ToleranceReader.Read(design), input => input.Input.ToString() == "MB/2 load.power-factor");
        Assert.Equal(1, factor.High);
        Assert.Equal(0.882, factor.Low, 9);
    }

    [Fact]
    public void Inputs_are_ranked_by_what_they_cost()
    {
        var finding = Find(Radial("22 m ± 20 %").With("-", "supply.loop-impedance", "0.3 ohm ± 10 %"), Decision.Guarded, "disconnection-tn:MB/2");

        // 4.4 m are worth 0.103 ohm, a tenth of the external loop 0.03 ohm, of a limit of 1.0925 ohm.
        Assert.Equal(["MB/2/leg 1 length", "- supply.loop-impedance"], finding.WorstCase!.Effects.Select(effect => effect.Input.Input.ToString()));
        Assert.Equal(0.10301 / 1.0925, finding.WorstCase.Effects[0].Loss!.Value, 0.001);
        Assert.Equal(0.03 / 1.0925, finding.WorstCase.Effects[1].Loss!.Value, 0.001);
        Assert.All(finding.WorstCase.Effects, effect => Assert.True(effect.IsMonotone));
    }

    [Fact]
    public void A_rule_that_only_a_tolerance_makes_apply_is_told_by_guarded_acceptance_alone()
    {
        // At 33 m the breaker opens in time: 0.3 ohm + 33 × 23.412 mohm is 1.073 ohm of 1.0925 ohm. At 53 m the fault is left to the residual
        // current device, whose rule asks for 0.95 × 230 V / (5 × 30 A) = 1.457 ohm, and 1.536 ohm is too much.
        var plan = Radial("33 m ± 60 %").With("MB/2", "rcd.type", "A").With("MB/2", "rcd.residual-current", "30 A");
        var simple = Keys(plan, Decision.Simple);
        var guarded = Audit.Run(plan.Build(Shipped.UnitedKingdom), Day, new Problems(), new Acceptance(Decision.Guarded));
        var added = guarded.Findings.Where(finding => !simple.Contains(finding.Key)).ToArray();

        var handedOver = Assert.Single(added, finding => finding.Rule.Id == "disconnection-tn-rcd");
        Assert.Contains("Zs 1.536 Ω", handedOver.Message, StringComparison.Ordinal);
        Assert.Equal(Verdict.Conforms, guarded.Find("disconnection-tn:MB/2")!.Verdict);
        Assert.All(added, finding => Assert.Equal(Verdict.Unproven, finding.Verdict));
        Assert.Equal(guarded.Findings.Select(finding => finding.Key), guarded.Findings.OrderBy(finding => Order(guarded.Design, finding)).ThenBy(finding => finding.Rule.Id, StringComparer.Ordinal).Select(finding => finding.Key));
    }

    [Fact]
    public void Samples_agree_with_a_linear_margin_under_a_uniform_input()
    {
        // Zs = 0.3 ohm + length × 23.412 mohm/m reaches 1.0925 ohm at 33.85 m: from 20 m to 40 m, 0.6925 of all lengths conform.
        var finding = Find(Radial("30 m ± 10 m"), new Acceptance(Decision.Simple, Samples: 20_000, Seed: 3), "disconnection-tn:MB/2");

        Assert.Equal(20_000, finding.Share!.Samples);
        Assert.InRange(finding.Share.StandardError, 0.0030, 0.0035);
        Assert.InRange((finding.Share.Share - 0.69254) / finding.Share.StandardError, -2, 2);
    }

    [Fact]
    public void The_same_seed_gives_the_same_samples_and_another_seed_others()
    {
        var plan = Radial("30 m ± 10 m");
        var first = Find(plan, new Acceptance(Samples: 1000, Seed: 7), "disconnection-tn:MB/2").Share;

        Assert.Equal(first, Find(plan, new Acceptance(Samples: 1000, Seed: 7), "disconnection-tn:MB/2").Share);
        Assert.NotEqual(first, Find(plan, new Acceptance(Samples: 1000, Seed: 8), "disconnection-tn:MB/2").Share);
    }

    private static int Order(Design design, Finding finding) => design.Subjects.ToList().IndexOf(finding.Subject);

    /// <summary>The fixed plan, with a type C breaker of 20 A on the radial at the main board.</summary>
    private static Plan Radial(string length) => Plans.Fixed.With("MB/2/leg 1", "length", length).With("MB/2", "device.curve", "C");

    private static HashSet<string> Keys(Plan plan, Decision decision) =>
        [.. Audit.Run(plan.Build(Shipped.UnitedKingdom), Day, new Problems(), new Acceptance(decision)).Findings.Select(finding => finding.Key)];

    private static Finding Find(Plan plan, Decision decision, string key) => Find(plan, new Acceptance(decision), key);

    private static Finding Find(Plan plan, Acceptance acceptance, string key) =>
        Audit.Run(plan.Build(Shipped.UnitedKingdom), Day, new Problems(), acceptance).Find(key)!;

    private static void AssertNotBetter(Judgement worst, Judgement found, string where)
    {
        var (rank, other) = (Rank(worst), Rank(found));
        var worse = other < rank || (other == rank && (found.Margin?.Relative ?? found.Margin?.Absolute ?? 0) < (worst.Margin?.Relative ?? worst.Margin?.Absolute ?? 0) - 1e-9);
        Assert.False(worse, $"{where}: {found.Verdict} {found.Margin} is worse than {worst.Verdict} {worst.Margin}");
    }

    private static int Rank(Judgement judgement) => judgement.Verdict switch
    {
        Verdict.Nonconforming => 0,
        Verdict.Undetermined => 1,
        Verdict.Conforms => 2,
        _ => 3,
    };
}
