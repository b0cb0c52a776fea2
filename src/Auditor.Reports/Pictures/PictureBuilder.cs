using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Pictures.Balance;
using Auditor.Reports.Pictures.Margins;
using Auditor.Reports.Pictures.Parts;
using Auditor.Reports.Pictures.Profiles;
using Auditor.Reports.Pictures.SingleLine;
using Auditor.Reports.Pictures.TimeCurrent;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Pictures;

/// <summary>Draws the pictures of an audit that its rule set plans.</summary>
public static class PictureBuilder
{
    /// <summary>The pictures in the order of their plans; a plan that finds nothing to show gives none, a large design may give several.</summary>
    /// <param name="result">The audit.</param>
    public static IReadOnlyList<Picture> Of(AuditResult result) => Invariantly.Make<IReadOnlyList<Picture>>(() =>
    {
        var scene = new Scene(result);
        return [.. result.Rules.Pictures.SelectMany(plan => Draw(scene, plan))];
    });

    private static IEnumerable<Picture> Draw(Scene scene, PicturePlan plan) => plan.Kind switch
    {
        "single-line" => new SingleLineDiagrams(scene, plan).Draw(),
        "margins" => new MarginStrips(scene, plan).Draw(),
        "time-current" => new TimeCurrentCharts(scene, plan).Draw(),
        "profile" => new ProfileCharts(scene, plan).Draw(),
        "balance" => new BalanceBars(scene, plan).Draw(),
        "parts" => new PartsCharts(scene, plan).Draw(),
        _ => [],
    };
}
