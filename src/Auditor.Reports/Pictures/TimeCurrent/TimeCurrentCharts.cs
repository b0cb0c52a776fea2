using Auditor.Documents;
using Auditor.Engine.RuleSets;

namespace Auditor.Reports.Pictures.TimeCurrent;

/// <summary>
/// Chooses the circuits whose time-current charts a reader wants first: by the gravest finding of the clause types that a chart speaks of, then
/// by the least margin. What is left out is said with the first chart.
/// </summary>
/// <param name="scene">The audit.</param>
/// <param name="plan">What to show.</param>
internal sealed class TimeCurrentCharts(Scene scene, PicturePlan plan)
{
    /// <summary>The charts, in the order of the design.</summary>
    public IEnumerable<Picture> Draw()
    {
        var types = plan.Settings.Texts("clause-types");
        var most = (int)plan.Settings.Scalar("most")!.Number;
        var known = scene.Circuits.Where(circuit => plan.Number(circuit, "rating") is not null).ToArray();
        var chosen = known.Select(circuit => (Circuit: circuit, Standing: Standing.Of([.. scene.FindingsOf(circuit).Where(finding => types.Contains(finding.Rule.Clause.Type))])))
            .OrderBy(pair => pair.Standing.Gravity).ThenBy(pair => pair.Standing.Tightest is { } tightest ? Standing.Margin(tightest) : double.PositiveInfinity)
            .Take(most).Select(pair => pair.Circuit).ToHashSet();
        var left = LeftOut(known.Length - chosen.Count, scene.Circuits.Count - known.Length);
        return scene.Circuits.Index().Where(entry => chosen.Contains(entry.Item))
            .Select((entry, number) => new TimeCurrentChart(scene, plan, entry.Item, $"{plan.Id}-{entry.Index + 1}").Draw(number == 0 ? left : ""));
    }

    private static string LeftOut(int lessGrave, int unknown) => string.Join(' ', new[]
    {
        lessGrave > 0 ? $"{lessGrave} circuits with less grave findings and greater margins have no chart." : "",
        unknown > 0 ? $"{unknown} circuits whose device has no stated rating have no chart." : "",
    }.Where(text => text.Length > 0));
}
