using System.Globalization;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Reports.Pictures.Drawing;

namespace Auditor.Reports.Pictures.SingleLine;

/// <summary>
/// Draws single-line diagrams: one of the whole installation where it fits on a printed page, else an overview of origin and boards and
/// one or more diagrams for each board.
/// </summary>
/// <param name="scene">The audit.</param>
/// <param name="plan">What to show.</param>
internal sealed class SingleLineDiagrams(Scene scene, PicturePlan plan)
{
    private const int RowsOfPage = 34;
    private const int MostDeep = 4;

    private readonly Dictionary<DesignSubject, int> _numbers = scene.Boards.Index().ToDictionary(entry => entry.Item, entry => entry.Index + 1);

    /// <summary>The diagrams; each subject is drawn in one of them.</summary>
    public IEnumerable<Picture> Draw()
    {
        var whole = Layout.Whole(scene);
        if (whole.Height <= Layout.Page && whole.Depth <= MostDeep)
        {
            return [Draw(plan.Id, plan.Title, whole, isOverview: false)];
        }

        var overview = Layout.Overview(scene);
        return overview.Index().Select(page => Draw(
            Numbered(plan.Id, page.Index), $"{plan.Title}: origin and boards" + (overview.Count > 1 ? $", part {page.Index + 1} of {overview.Count}" : ""),
            page.Item, isOverview: true)).Concat(scene.Boards.SelectMany(Parts));
    }

    private IEnumerable<Picture> Parts(DesignSubject board)
    {
        var pages = scene.CircuitsOf[board].Chunk(RowsOfPage).ToArray();
        return pages.Index().Select(page => Draw(
            Numbered(IdOf(board), page.Index),
            $"{plan.Title}: {Scene.Label(board)}" + (pages.Length > 1 ? $", {Texts.OwnId(page.Item[0])} to {Texts.OwnId(page.Item[^1])}" : ""),
            Layout.Part(board, page.Item, page.Index == 0), isOverview: false));
    }

    private static string Numbered(string id, int index) => index == 0 ? id : string.Create(CultureInfo.InvariantCulture, $"{id}-{index + 1}");

    private string IdOf(DesignSubject board) => string.Create(CultureInfo.InvariantCulture, $"{plan.Id}-b{_numbers[board]}");

    private Picture Draw(string id, string title, Layout layout, bool isOverview)
    {
        var columns = new Columns(layout.Depth);
        var canvas = new Canvas(id, title, plan.About);
        var pen = new DiagramPen(scene, plan, canvas, columns, board => scene.CircuitsOf[board].Any() ? IdOf(board) : plan.Id, isOverview);
        using (canvas.Definitions())
        {
            Badges.Define(canvas, scene.Marks);
            Symbols.Define(canvas, layout.Items.SelectMany(pen.SymbolsOf).Distinct().Order(StringComparer.Ordinal));
        }

        Busbars(canvas, layout);
        foreach (var item in layout.Items)
        {
            pen.Draw(item);
        }

        Badges.Legend(canvas, scene.Marks, 24, layout.Height + 6);
        return new Picture(id, plan.Kind, title, plan.About, canvas.Finish(columns.Width, layout.Height + 24), Table(layout));
    }

    /// <summary>The supply of the boards at the origin on the left, and a busbar from the head of each board to its last circuit.</summary>
    private static void Busbars(Canvas canvas, Layout layout)
    {
        var heads = layout.Items.Where(item => item.Kind == ItemKind.Board).ToArray();
        if (layout.Items[0].Kind == ItemKind.Origin && heads.LastOrDefault(head => head.Depth == 0) is { } last)
        {
            canvas.Line(Columns.Trunk, layout.Items[0].Y + 50, Columns.Trunk, last.Y, "line");
        }

        foreach (var head in heads)
        {
            var end = layout.Items.LastOrDefault(item => item.Kind == ItemKind.Circuit && item.Subject.Parent == head.Subject)?.Y ?? head.Y;
            var x = Columns.Bus(head.Depth);
            canvas.Line(x, head.Y - 6, x, end + 6, "heavy");
        }
    }

    private PictureTable Table(Layout layout) => new(
        "What the diagram draws, with the gravest finding and the least margin of each",
        ["Subject", "Name", "Fed from", "Device", "Values", "Verdict", "Least margin", "Clause type"],
        [.. layout.Items.Where(item => item.IsOwn).SelectMany(item => item.Subject.Legs.Count > 0 ? [item.Subject, .. item.Subject.Legs] : new[] { item.Subject })
            .Select(Row)]);

    private IReadOnlyList<string> Row(DesignSubject subject)
    {
        var standing = scene.StandingOf(subject);
        var cable = string.Join(", ", new[] { plan.Known(subject, "text", ", "), plan.Known(subject, "note", ", ") }.Where(text => text.Length > 0));
        return
        [
            subject.Parent is null ? "The installation" : subject.Key, Scene.Name(subject),
            subject.Parent is { } parent ? (parent.Parent is null ? "origin" : parent.Key) : "supply", plan.Known(subject, "device-text"), cable,
            standing.Lead?.VerdictText ?? "no rule applied",
            standing.Tightest is { } tightest ? ValueText.ShowMargin(Standing.Margin(tightest)!.Value) : "", standing.Tightest?.Rule.Clause.Type ?? "",
        ];
    }
}
