using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;

namespace Auditor.Reports.Pictures.Profiles;

/// <summary>Draws a value along the paths from the origin: in one chart where the circuits can be told apart, else in a chart for each board.</summary>
/// <param name="scene">The audit.</param>
/// <param name="plan">What to show.</param>
internal sealed class ProfileCharts(Scene scene, PicturePlan plan)
{
    private const int MostTogether = 60;

    /// <summary>The charts; none where no value is known.</summary>
    public IEnumerable<Picture> Draw()
    {
        var ends = scene.Circuits.Where(circuit => circuit.FedBoard is null).ToArray();
        if (!ends.Any(IsKnown))
        {
            return [];
        }

        return ends.Length <= MostTogether
            ? [new ProfileChart(scene, plan, ends, plan.Id, plan.Title).Draw()]
            : scene.Boards.Index().Select(entry => (entry.Index, entry.Item, Ends: scene.CircuitsOf[entry.Item].Where(circuit => circuit.FedBoard is null).ToArray()))
                .Where(board => board.Ends.Any(IsKnown))
                .Select(board => new ProfileChart(scene, plan, board.Ends, $"{plan.Id}-b{board.Index + 1}", $"{plan.Title}: {Scene.Label(board.Item)}").Draw());
    }

    private bool IsKnown(DesignSubject circuit) => plan.Number(circuit, "along") is not null && plan.Number(circuit, "value") is not null;
}
