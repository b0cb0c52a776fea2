using System.Globalization;
using System.Text;
using Auditor.Engine.Findings;
using Auditor.Engine.RuleSets;
using Auditor.Quantities;
using Auditor.Reports.Pictures.Drawing;

namespace Auditor.Reports.Pictures.Margins;

/// <summary>Draws where a design is tight: the margins of all findings, a strip for each type of clause, the tightest first.</summary>
/// <param name="scene">The audit.</param>
/// <param name="plan">What to show.</param>
internal sealed class MarginStrips(Scene scene, PicturePlan plan)
{
    private const double Left = 216;
    private const double Right = 700;
    private const double Width = 960;
    private const double Top = 44;
    private const double StripHeight = 44;
    private const double Step = 7;
    private const double Slack = 1e-6;
    private const int MostStacked = 5;
    private const int MostMarked = 6;

    private static readonly Unit Percent = UnitCatalog.Find("%")!;

    /// <summary>The picture; none where nothing was measured.</summary>
    public IEnumerable<Picture> Draw()
    {
        var strips = scene.Result.Findings.GroupBy(finding => finding.Rule.Clause.Type)
            .Select(group => new Strip(
                group.Key, [.. group.Where(finding => Margin(finding) is not null).OrderBy(Margin)], group.Count(finding => finding.Verdict == Verdict.Undetermined)))
            .Where(strip => strip.Measured.Count > 0)
            .OrderBy(strip => Margin(strip.Measured[0])).ThenBy(strip => strip.Type, StringComparer.Ordinal).ToArray();
        return strips.Length == 0 ? [] : [Draw(strips)];
    }

    private static double? Margin(Finding finding) => finding.Judgement.Margin?.Relative;

    private Picture Draw(Strip[] strips)
    {
        var canvas = new Canvas(plan.Id, plan.Title, plan.About);
        var scale = new MarginScale([.. strips.SelectMany(strip => strip.Measured).Select(finding => Margin(finding)!.Value)], Left, Right);
        var bottom = Top + (strips.Length * StripHeight);
        using (canvas.Definitions())
        {
            Badges.Define(canvas, scene.Marks);
        }

        Axis(canvas, scale, bottom);
        foreach (var (index, strip) in strips.Index())
        {
            Draw(canvas, scale, strip, Top + ((index + 1) * StripHeight) - 10);
        }

        Badges.Legend(canvas, scene.Marks.Except(["undetermined", "conforms"]), 24, bottom + 38);
        return new Picture(plan.Id, plan.Kind, plan.Title, plan.About, canvas.Finish(Width, bottom + 56), Table(strips));
    }

    private static void Axis(Canvas canvas, MarginScale scale, double bottom)
    {
        var zero = scale.Of(0);
        canvas.Rect(Left, Top - 6, zero - Left, bottom - Top + 6, "band");
        var free = double.NegativeInfinity;
        foreach (var mark in scale.Ticks)
        {
            var x = scale.Of(mark);
            canvas.Line(x, Top - 6, x, bottom, mark == 0 ? "limit" : "grid");
            var text = (mark > 0 ? "+" : "") + ValueText.ShowNumber(mark, Percent);
            var half = Canvas.WidthOf(text, "s b") / 2;
            if (x - half >= free && (mark >= 0 || x + half < zero - 14))
            {
                canvas.Text(x, Top - 12, text, mark == 0 ? "s b c" : "s m c");
                canvas.Text(x, bottom + 14, text, mark == 0 ? "s b c" : "s m c");
                free = x + half + 4;
            }
        }

        canvas.Text(zero - 8, 12, "← limit broken", "s b e");
        canvas.Text(zero + 8, 12, "limit kept →", "s b");
    }

    private void Draw(Canvas canvas, MarginScale scale, Strip strip, double y)
    {
        canvas.Line(24, y + 5, Width - 16, y + 5, "grid");
        canvas.TextWithin(24, y - 14, strip.Type, "t b", Left - 34);
        canvas.Text(24, y, $"{strip.Measured.Count} measured" + (strip.Open > 0 ? $", {strip.Open} open" : ""), "s m");
        // Bins begin at the zero line, so that none holds margins of both sides.
        var zero = scale.Of(0);
        var bins = strip.Measured.GroupBy(finding => zero + ((Math.Floor((scale.Of(Margin(finding)!.Value) - zero + Slack) / Step) + 0.5) * Step)).ToArray();
        var most = bins.Max(bin => bin.Count());
        if (most > MostStacked)
        {
            Bars(canvas, bins, most, y, conforming: true);
        }
        else
        {
            Dots(canvas, bins, y);
        }

        Marks(canvas, scale, bins, most, strip, y);
        foreach (var (index, finding) in strip.Measured.Take((int)Labelled).Index())
        {
            using var link = canvas.Link(Anchor.Of(finding.Key), $"{finding.Key}: {ValueText.ShowMargin(Margin(finding)!.Value)}, {finding.VerdictText}");
            var at = y - 14 - (index * 12);
            canvas.Text(Right + 18, at, ValueText.ShowMargin(Margin(finding)!.Value), "t b");
            var name = Right + 28 + Canvas.WidthOf(ValueText.ShowMargin(Margin(finding)!.Value), "t b");
            canvas.TextWithin(name, at, Scene.Label(finding.Subject), "t", Width - name - 8);
            canvas.TextWithin(Right + 18, y, finding.Rule.Id, "s m", Width - Right - 34);
        }
    }

    private double Labelled => (plan.Settings.Find("labelled") as Documents.ScalarNode)?.Number ?? 1;

    /// <summary>A dot for each finding that conforms, those of nearly the same margin stacked; all in one path, for there are many.</summary>
    private static void Dots(Canvas canvas, IGrouping<double, Finding>[] bins, double y)
    {
        var dots = new StringBuilder();
        foreach (var bin in bins)
        {
            for (var level = 0; level < bin.Count(finding => finding.Verdict == Verdict.Conforms); level++)
            {
                dots.Append(CultureInfo.InvariantCulture, $"M{Canvas.N(bin.Key)} {Canvas.N(y - 1 - (level * 6.5))}h0");
            }
        }

        Path(canvas, dots, "conforms dot");
    }

    /// <summary>Where dots would not fit a bar stands for how many conform, as a share of the most that any bar of the strip has.</summary>
    private static void Bars(Canvas canvas, IGrouping<double, Finding>[] bins, int most, double y, bool conforming)
    {
        var bars = new StringBuilder();
        foreach (var bin in bins.Where(bin => bin.Any(finding => finding.Verdict == Verdict.Conforms == conforming)))
        {
            var height = Math.Max(2, 30.0 * bin.Count(finding => finding.Verdict == Verdict.Conforms == conforming) / most);
            bars.Append(CultureInfo.InvariantCulture, $"M{Canvas.N(bin.Key - 2.5)} {Canvas.N(y + 4)}v-{Canvas.N(height)}h5v{Canvas.N(height)}z");
        }

        Path(canvas, bars, conforming ? "conforms solid" : "nonconforming solid");
    }

    /// <summary>A mark of its own, with a link, for each finding that does not conform; where they are many bars, and a mark for the tightest.</summary>
    private static void Marks(Canvas canvas, MarginScale scale, IGrouping<double, Finding>[] bins, int most, Strip strip, double y)
    {
        var marked = strip.Measured.Where(finding => finding.Verdict != Verdict.Conforms).ToArray();
        if (marked.Length > MostMarked)
        {
            Bars(canvas, bins, most, y, conforming: false);
            marked = marked[..1];
        }

        foreach (var finding in marked)
        {
            using var link = canvas.Link(Anchor.Of(finding.Key), $"{finding.Key}: {ValueText.ShowMargin(Margin(finding)!.Value)}, {finding.VerdictText}");
            canvas.Use(Standing.Mark(finding), scale.Of(Margin(finding)!.Value), y - 5);
        }
    }

    private static void Path(Canvas canvas, StringBuilder data, string look)
    {
        if (data.Length > 0)
        {
            canvas.Path(data.ToString(), look);
        }
    }

    private static PictureTable Table(Strip[] strips) => new(
        "Margins by type of clause, the tightest type first; the margin of every finding stands with the finding",
        ["Clause type", "Measured", "Limit broken", "Open", "Least margin", "Rule", "Subject", "Value", "Limit"],
        [.. strips.Select(IReadOnlyList<string> (strip) =>
        [
            strip.Type, Count(strip.Measured.Count), Count(strip.Measured.Count(finding => finding.Verdict != Verdict.Conforms)), Count(strip.Open),
            ValueText.ShowMargin(Margin(strip.Measured[0])!.Value), strip.Measured[0].Rule.Id, Scene.Label(strip.Measured[0].Subject),
            strip.Measured[0].ValueShown, strip.Measured[0].LimitShown,
        ])]);

    private static string Count(int count) => count.ToString(CultureInfo.InvariantCulture);

    private sealed record Strip(string Type, IReadOnlyList<Finding> Measured, int Open);
}
