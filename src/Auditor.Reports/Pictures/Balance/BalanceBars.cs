using System.Globalization;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Values;
using Auditor.Reports.Pictures.Drawing;

namespace Auditor.Reports.Pictures.Balance;

/// <summary>
/// Draws what each line conductor of origin and boards carries, as a share of what it may carry, so that small boards and large ones can be
/// compared. The lines of one board stand below one another: bars of unequal length show the unbalance.
/// </summary>
/// <param name="scene">The audit.</param>
/// <param name="plan">What to show.</param>
internal sealed class BalanceBars(Scene scene, PicturePlan plan)
{
    private const int MostOfPage = 16;
    private const double Left = 270;
    private const double Full = 780;
    private const double Width = 960;
    private const double Bar = 15;
    private const double Gap = 16;

    private static readonly string[] Series = ["s1 solid", "s2 solid", "s3 solid", "s4 solid"];

    /// <summary>The pictures; none where no current is known.</summary>
    public IEnumerable<Picture> Draw()
    {
        var subjects = scene.Boards.Prepend(scene.Installation).Where(subject => Lines(subject).Any(line => !line.Of(subject).IsMissing)).ToArray();
        var pages = subjects.Chunk(MostOfPage).ToArray();
        return pages.Select((page, number) => Draw(
            number == 0 ? plan.Id : string.Create(CultureInfo.InvariantCulture, $"{plan.Id}-{number + 1}"),
            plan.Title + (pages.Length > 1 ? $": {Name(page[0])} to {Name(page[^1])}" : ""), page));
    }

    private static string Name(DesignSubject subject) => subject.Parent is null ? "origin" : subject.Key;

    /// <summary>The lines that a subject has: those that its own list of conductors names, and the neutral where there are several.</summary>
    private IEnumerable<PlannedQuantity> Lines(DesignSubject subject)
    {
        var conductors = plan.Word(subject, "conductors");
        var lines = plan.All(subject.Shape, "line").Where(line => conductors is null || conductors.Split('-').Contains(line.Label)).ToArray();
        return lines.Length > 1 ? lines.Concat(plan.All(subject.Shape, "neutral")) : lines;
    }

    private Picture Draw(string id, string title, DesignSubject[] subjects)
    {
        var canvas = new Canvas(id, title, plan.About);
        var most = subjects.SelectMany(subject => Lines(subject).Select(line => Share(subject, line.Of(subject)))).Append(1.1).Max();
        var scale = (Full - Left) / most;
        var heights = subjects.Select(subject => Math.Max(34, Lines(subject).Count() * Bar) + Gap).ToArray();
        var bottom = 34 + heights.Sum();
        canvas.Line(Left + scale, 24, Left + scale, bottom - 8, "limit dash");
        canvas.Text(Left + scale, 16, "rated current of what feeds it", "s b c");
        var y = 34.0;
        foreach (var (index, subject) in subjects.Index())
        {
            Draw(canvas, subject, y, scale);
            y += heights[index];
        }

        canvas.Line(Left, 24, Left, bottom - 8, "thin");
        return new Picture(id, plan.Kind, title, plan.About, canvas.Finish(Width, bottom), Table(subjects));
    }

    /// <summary>Share of the limit; nil where either is not known.</summary>
    private double Share(DesignSubject subject, in Value current) =>
        current.Kind == ValueKind.Quantity && plan.Number(subject, "limit") is { } limit and > 0 ? current.Number / limit : 0;

    private void Draw(Canvas canvas, DesignSubject subject, double top, double scale)
    {
        using var group = canvas.Subject(subject.Key);
        var lines = Lines(subject).ToArray();
        var standing = scene.StandingOf(subject);
        using (standing.Lead is { } lead ? canvas.Link(Anchor.Of(lead.Key), $"{Scene.Label(subject)}: {lead.VerdictText}") : canvas.Open("g"))
        {
            canvas.TextWithin(16, top + 11, subject.Parent is null ? "Origin" : Scene.Label(subject), "t b", Left - 60);
        }

        var limit = plan.One(subject.Shape, "limit") is { } rated && !rated.Of(subject).IsMissing ? "of " + rated.Show(subject) : "rating not known";
        canvas.TextWithin(16, top + 26, string.Join(", ", new[] { limit, lines.Length > 1 ? plan.Known(subject, "text") : "" }.Where(text => text.Length > 0)), "s m", Left - 60);
        var order = plan.All(subject.Shape, "line").Concat(plan.All(subject.Shape, "neutral")).ToArray();
        foreach (var (index, line) in lines.Index())
        {
            var (y, value) = (top + (index * Bar), line.Of(subject));
            canvas.Text(Left - 10, y + 11, line.Label, "s b e");
            var length = Share(subject, value) * scale;
            if (length > 0)
            {
                canvas.Rect(Left, y + 2, Math.Max(1, length), Bar - 4, Series[Array.IndexOf(order, line) % Series.Length]);
            }

            canvas.Text(Beside(Left + length + 6, line.Show(subject), Left + scale), y + 11, line.Show(subject), "s");
        }
    }

    /// <summary>Where a text stands clear of the line of the limit: where it wants to, or right of the line.</summary>
    private static double Beside(double x, string text, double limit) => x < limit + 4 && x + Canvas.WidthOf(text, "s") > limit - 4 ? limit + 5 : x;

    private PictureTable Table(DesignSubject[] subjects)
    {
        var board = scene.Boards[0].Shape;
        var headings = plan.All(board, "line").Concat(plan.All(board, "neutral")).Select(line => line.Label).ToArray();
        return new PictureTable(
            "Demand on each conductor, and the rated current of what feeds it", ["Board", "Name", .. headings, "Rated current", .. plan.Headings(board, "text")],
            [.. subjects.Select(IReadOnlyList<string> (subject) =>
            [
                Name(subject), Scene.Name(subject),
                .. headings.Select(heading => plan.All(subject.Shape, "line").Concat(plan.All(subject.Shape, "neutral")).FirstOrDefault(line => line.Label == heading)?.Show(subject) ?? ""),
                plan.One(subject.Shape, "limit")?.Show(subject) ?? "",
                .. subject.Shape == board ? plan.Values(subject, "text") : plan.Headings(board, "text").Select(_ => ""),
            ])]);
    }
}
