using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Quantities;
using Auditor.Reports.Pictures.Drawing;
using Auditor.Reports.Pictures.Plotting;
using OxyPlot;

namespace Auditor.Reports.Pictures.Profiles;

/// <summary>
/// A value along the paths to some circuits: thick to the boards, thin to the ends of circuits. The shape of an end tells its limit; the ends
/// nearest to their limit, or beyond it, are named at the side.
/// </summary>
/// <param name="scene">The audit.</param>
/// <param name="plan">What to show.</param>
/// <param name="ends">The circuits.</param>
/// <param name="id">Id of the picture.</param>
/// <param name="title">Title of the picture.</param>
internal sealed class ProfileChart(Scene scene, PicturePlan plan, IReadOnlyList<DesignSubject> ends, string id, string title)
{
    private const int MostNamed = 8;
    private const int MostLimits = 3;
    private const double NameHeight = 26;

    private static readonly string[] Roles = ["along", "value", "limit"];

    private static readonly OxySize Size = new(960, 460);
    private static readonly OxyRect Area = new(64, 34, 600, 380);

    private readonly Unit _length = plan.One(ends[0].Shape, "along")!.Formula.Unit!;
    private readonly Unit _unit = plan.One(ends[0].Shape, "value")!.Formula.Unit!;

    /// <summary>Draws the chart.</summary>
    public Picture Draw()
    {
        var known = ends.Select(End).OfType<PathEnd>().ToArray();
        var limits = known.Select(end => end.Limit).OfType<double>().Distinct().Order().ToArray();
        var plot = new Plot(
            Size, Area, Plot.Linear(0, known.Max(end => end.Along) * 1.06, _length, isNilSaid: false),
            Plot.Linear(0, known.Select(end => end.Value).Concat(limits).Max() * 1.08, _unit, isNilSaid: true));
        plot.Line(known.SelectMany(end => Segment(end.Circuit.Parent!, end)), "thin");
        plot.Line(Ways(known), "stroke");
        var canvas = new Canvas(id, title, plan.About);
        using (canvas.Definitions())
        {
            Badges.Define(canvas, scene.Marks);
        }

        plot.Draw(canvas);
        Limits(canvas, plot, known, limits);
        Boards(canvas, plot, known);
        Ends(canvas, plot, known, limits);
        Names(canvas, plot, known);
        canvas.Text(Area.Right, Area.Bottom + 30, "length of wiring from the origin", "s m e");
        return new Picture(id, plan.Kind, title, plan.About, canvas.Finish(Size.Width, Size.Height), Table());
    }

    private PathEnd? End(DesignSubject circuit) =>
        plan.Number(circuit, "along") is { } along && plan.Number(circuit, "value") is { } value
            ? new PathEnd(circuit, along, value, plan.Number(circuit, "limit"))
            : null;

    private IEnumerable<DataPoint> Segment(DesignSubject from, PathEnd to) => Point(from) is { } start
        ? [start, new DataPoint(to.Along, to.Value), DataPoint.Undefined]
        : [];

    private DataPoint? Point(DesignSubject subject) =>
        plan.Number(subject, "along") is { } along && plan.Number(subject, "value") is { } value ? new DataPoint(along, value) : null;

    /// <summary>The stretches between origin and boards on the way to the circuits, each once.</summary>
    private IEnumerable<DataPoint> Ways(IEnumerable<PathEnd> known)
    {
        foreach (var board in BoardsOnTheWay(known))
        {
            var start = board.Parent!.Parent is { } before ? Point(before) : Point(scene.Installation);
            if (start is { } from && Point(board) is { } to)
            {
                yield return from;
                yield return to;
                yield return DataPoint.Undefined;
            }
        }
    }

    private IEnumerable<DesignSubject> BoardsOnTheWay(IEnumerable<PathEnd> known) => known.SelectMany(end => Above(end.Circuit)).Distinct();

    private IEnumerable<DesignSubject> Above(DesignSubject circuit)
    {
        for (var at = circuit.Parent; at is not null; at = at.Parent)
        {
            if (at.Shape == scene.Boards[0].Shape)
            {
                yield return at;
            }
        }
    }

    /// <summary>Few limits are lines across the chart; many are a stroke above or below each end.</summary>
    private void Limits(Canvas canvas, Plot plot, IEnumerable<PathEnd> known, double[] limits)
    {
        if (limits.Length > MostLimits)
        {
            var strokes = known.Where(end => end.Limit is not null).Select(end => plot.Place(end.Along, end.Limit!.Value))
                .Select(at => $"M{Canvas.N(at.X - 7)} {Canvas.N(at.Y)}h14").Distinct();
            canvas.Path(string.Concat(strokes), "limit");
            canvas.Line(Area.Left + 12, Area.Top - 14, Area.Left + 26, Area.Top - 14, "limit");
            canvas.Text(Area.Left + 32, Area.Top - 10, "the most that is permitted at the end of that length", "s");
            return;
        }

        foreach (var (index, limit) in limits.Index())
        {
            var y = plot.Place(0, limit).Y;
            canvas.Line(Area.Left, y, Area.Right, y, "limit" + (index % 2 == 0 ? " dash" : " long"));
            canvas.Text(Area.Left + 28, y - 5, $"at most {ValueText.ShowNumber(limit, _unit)}", "s b halo");
            Shape(canvas, Area.Left + 16, y - 9, index);
        }
    }

    /// <summary>The boards on the way; where names would lie over one another the first stands, and the table has the others.</summary>
    private void Boards(Canvas canvas, Plot plot, IEnumerable<PathEnd> known)
    {
        var taken = new List<OxyRect>();
        foreach (var board in BoardsOnTheWay(known))
        {
            if (Point(board) is not { } point)
            {
                continue;
            }

            var at = plot.Place(point.X, point.Y);
            canvas.Rect(at.X - 3.5, at.Y - 3.5, 7, 7, "solid");
            var name = TextWidth.Fit(board.Key, 11, 90);
            var room = new OxyRect(at.X - 2, at.Y - 20, Canvas.WidthOf(name, "s b"), 13);
            if (point.X > 0 && !taken.Exists(other => other.Left < room.Right && room.Left < other.Right && other.Top < room.Bottom && room.Top < other.Bottom))
            {
                canvas.Text(room.Left, room.Bottom - 2, name, "s b halo");
                taken.Add(room);
            }
        }
    }

    private static void Ends(Canvas canvas, Plot plot, IEnumerable<PathEnd> known, double[] limits)
    {
        foreach (var end in known)
        {
            var at = plot.Place(end.Along, end.Value);
            Shape(canvas, at.X, at.Y, end.Limit is { } limit && limits.Length <= MostLimits ? Array.IndexOf(limits, limit) : -1);
        }
    }

    /// <summary>The shape of the ends that share a limit.</summary>
    private static void Shape(Canvas canvas, double x, double y, int limit)
    {
        switch (limit)
        {
            case 0: canvas.Circle(x, y, 3.4, "s1 solid"); break;
            case 1: canvas.Path($"M{Canvas.N(x)} {Canvas.N(y - 4.4)}l4.4 4.4l-4.4 4.4l-4.4 -4.4z", "s2 solid"); break;
            case 2: canvas.Path($"M{Canvas.N(x)} {Canvas.N(y - 4.4)}l4.4 7.6h-8.8z", "s3 solid"); break;
            default: canvas.Circle(x, y, 3, "hollow"); break;
        }
    }

    /// <summary>Names at the side, from the top in the order of the values, with a line from each end; none over another.</summary>
    private void Names(Canvas canvas, Plot plot, PathEnd[] known)
    {
        var named = known.OrderBy(end => end.Room).Take(MostNamed).OrderByDescending(end => end.Value).ToArray();
        var heights = LabelColumn.Spread([.. named.Select(end => plot.Place(0, end.Value).Y)], NameHeight, Area.Top + 8, Area.Bottom - 8);
        foreach (var (index, end) in named.Index())
        {
            var at = plot.Place(end.Along, end.Value);
            var (x, y) = (Area.Right + 56, heights[index]);
            canvas.Path($"M{Canvas.N(at.X)} {Canvas.N(at.Y)}L{Canvas.N(Area.Right + 12)} {Canvas.N(y)}H{Canvas.N(x - 14)}", "grid");
            var standing = scene.StandingOf(end.Circuit);
            using var link = standing.Lead is { } lead ? canvas.Link(Anchor.Of(lead.Key), $"{Scene.Label(end.Circuit)}: {Words(end)}") : canvas.Open("g");
            if (end.Room < 0)
            {
                canvas.Use("nonconforming", x - 10, y);
            }

            canvas.TextWithin(x, y - 1, Scene.Label(end.Circuit), "t b", Size.Width - x - 12);
            canvas.TextWithin(x, y + 11, Words(end), "s m", Size.Width - x - 12);
        }
    }

    private string Words(PathEnd end) => ValueText.ShowNumber(end.Value, _unit)
        + (end.Limit is { } limit ? $" of {ValueText.ShowNumber(limit, _unit)}" : "") + $", {ValueText.ShowNumber(end.Along, _length)}";

    private PictureTable Table() => new(
        "Values at the end of each path, and their limits", ["Circuit", "Name", .. Roles.Select(role => plan.One(ends[0].Shape, role)?.Label ?? role)],
        [.. ends.Select(IReadOnlyList<string> (end) =>
            [end.Key, Scene.Name(end), .. Roles.Select(role => plan.One(end.Shape, role)?.Show(end) ?? "")])]);

    private sealed record PathEnd(DesignSubject Circuit, double Along, double Value, double? Limit)
    {
        /// <summary>What is left to the limit, as a share of it; below zero beyond it.</summary>
        public double Room => Limit is { } limit and > 0 ? (limit - Value) / limit : double.PositiveInfinity;
    }
}
