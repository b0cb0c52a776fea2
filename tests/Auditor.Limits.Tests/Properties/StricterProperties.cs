using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using CsCheck;

namespace Auditor.Limits.Tests.Properties;

/// <summary>
/// A stricter rule set never finds less: what was wrong, or could not be decided, never comes to be kept.
/// <para>One parameter is left to a property of its own because of physics. A lower voltage factor for least fault currents makes every
/// device slower, but a fault of less current also heats less while the device opens at once, and where the circuit-breaker becomes too slow
/// the residual current device counts in its place (BS 7671 411.4.5) and is held to limits of its own. A time that was too long may come
/// to be undetermined where the current falls below the first point of the device's curve; it never comes to be kept.</para>
/// </summary>
public class StricterProperties
{
    private const string VoltageFactor = "cmin";
    private const int Sets = 8;

    private static readonly Gen<RuleSet> Stricter =
        Gen.Select(Gen.Double[0, 0.5], Gen.Bool, (share, isMoved) => (share, isMoved)).Array[StricterSets.Movable.Count]
        .Select(moves => StricterSets.Of(StricterSets.Movable.Zip(moves).Where(pair => pair.Second.isMoved && pair.First.Id != VoltageFactor).Select(pair => (pair.First, pair.Second.share))));

    private static readonly Gen<RuleSet> LowerVoltageFactor =
        Gen.Double[0.01, 0.3].Select(share => StricterSets.Of((StricterSets.Movable.Single(parameter => parameter.Id == VoltageFactor), share)));

    [Fact]
    public void What_was_found_is_found_still() => Sample(Stricter, (before, after) =>
    {
        foreach (var (key, was) in before.Judgements.Where(pair => pair.Value.Verdict is Verdict.Nonconforming or Verdict.Undetermined))
        {
            var now = after.Judgements[key].Verdict;
            Assert.True(
                now is Verdict.Nonconforming or Verdict.Undetermined || (now is null && IsNotKeptByTheSameClause(after, key)),
                $"{key}: {was.Verdict}, then {now?.ToString() ?? "not applied"}");
        }
    });

    [Fact]
    public void A_lower_voltage_factor_finds_no_less_about_disconnection_in_time() => Sample(LowerVoltageFactor, (before, after) =>
    {
        foreach (var key in before.Keys("circuit"))
        {
            Order.NeverRises(before.Number(key, "Zs_max"), after.Number(key, "Zs_max"), $"{key} Zs_max");
            Order.NeverFalls(before.Number(key, "t_oc"), after.Number(key, "t_oc"), $"{key} t_oc");
            Assert.False(before.Holds(key, "cleared_by_rcd") && !after.Holds(key, "cleared_by_rcd"), $"{key} no longer needs the residual current device");
        }

        Rules.Each(before, after, [.. Rules.Disconnections, .. Rules.Times], (key, was, now) =>
        {
            Order.NeverRises(was.Margin?.Absolute, now.Margin?.Absolute, $"{key} margin");
            Assert.False(was.Verdict == Verdict.Nonconforming && now.Verdict == Verdict.Conforms, $"{key} came right");
        });
        Assert.All(
            before.Judgements.Where(pair => pair.Key.Rule == "disconnection-tn" && pair.Value.Verdict == Verdict.Nonconforming),
            pair => Assert.Equal(Verdict.Nonconforming, after.Judgements[pair.Key].Verdict));
    });

    /// <summary>The set of the test data adds rules that nothing keeps.</summary>
    [Fact]
    public void Rules_that_are_added_change_nothing_of_what_the_others_find() => Plans.Any.Sample(plan =>
    {
        var before = Judged.Of(plan, Shipped.UnitedKingdom);
        var after = Judged.Of(plan, Shipped.House("no-remedy"));
        Assert.All(before.Judgements, pair => Assert.Equal((pair.Value.Verdict, pair.Value.Margin), (after.Judgements[pair.Key].Verdict, after.Judgements[pair.Key].Margin)));
        Assert.True(after.Judgements.Values.Count(judgement => judgement.Verdict == Verdict.Nonconforming) > before.Judgements.Values.Count(judgement => judgement.Verdict == Verdict.Nonconforming));
    }, iter: 5);

    /// <summary>Rules on readings give way to one another: where the plain limit is not kept, the closer one says nothing.</summary>
    private static bool IsNotKeptByTheSameClause(Judged after, (string Rule, string Subject) key)
    {
        var clause = Shipped.UnitedKingdom.Rule(key.Rule)!.Clause.Type;
        return after.Judgements.Any(pair =>
            pair.Key.Subject == key.Subject && (pair.Value.Verdict is Verdict.Nonconforming or Verdict.Undetermined) && Shipped.UnitedKingdom.Rule(pair.Key.Rule)?.Clause.Type == clause);
    }

    private static void Sample(Gen<RuleSet> sets, Action<Judged, Judged> check) => Gen.Select(sets, Plans.Any.Array[6]).Sample((set, plans) =>
    {
        foreach (var plan in plans)
        {
            check(Judged.Of(plan, Shipped.UnitedKingdom), Judged.Of(plan, set));
        }
    }, iter: Sets);
}
