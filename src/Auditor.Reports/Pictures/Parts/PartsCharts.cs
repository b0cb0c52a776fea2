using System.Globalization;
using Auditor.Documents;
using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Values;
using Auditor.Reports.Pictures.Drawing;
using Auditor.Reports.Pictures.Plotting;
using OxyPlot;

namespace Auditor.Reports.Pictures.Parts;

/// <summary>
/// Draws the readings of all parts and of the whole on one logarithmic axis, with the least that each may be. The whole stands first, below
/// the least of its parts by as much as all of them together make it.
/// </summary>
/// <param name="scene">The audit.</param>
/// <param name="plan">What to show.</param>
internal sealed class PartsCharts(Scene scene, PicturePlan plan)
{
    private const int MostOfPage = 40;
    private const double RowHeight = 24;
    private const double Left = 260;
    private const double Right = 760;
    private const double Width = 960;
    private const double Top = 56;

    /// <summary>The charts; none where nothing was read.</summary>
    public IEnumerable<Picture> Draw()
    {
        var read = scene.Circuits.Where(circuit => Readings(circuit).Any(reading => reading is not null)).ToArray();
        var pages = read.Chunk(MostOfPage).ToArray();
        return pages.Select((page, number) => Draw(
            number == 0 ? plan.Id : string.Create(CultureInfo.InvariantCulture, $"{plan.Id}-{number + 1}"),
            plan.Title + (pages.Length > 1 ? $": {page[0].Key} to {page[^1].Key}" : ""), page, number == pages.Length - 1));
    }

    private IEnumerable<double?> Readings(DesignSubject subject) =>
        plan.All(subject.Shape, "reading").Select(reading => reading.Of(subject) is { Kind: ValueKind.Quantity, Number: > 0 } value ? value.Number : (double?)null);

    private Picture Draw(string id, string title, DesignSubject[] circuits, bool isLast)
    {
        DesignSubject[] rows = [scene.Installation, .. circuits];
        var unit = plan.All(circuits[0].Shape, "reading").First().Formula.Unit!;
        var numbers = rows.SelectMany(row => Readings(row).Append(plan.Number(row, "limit"))).OfType<double>().ToArray();
        var bottom = Top + (rows.Length * RowHeight);
        var size = new OxySize(Width, bottom + 50);
        var plot = new Plot(
            size, new OxyRect(Left, Top - 10, Right - Left, bottom - Top + 10), Plot.Logarithmic(Decade(numbers.Min() * 0.99, down: true), Decade(numbers.Max() * 1.01, down: false), unit),
            Plot.Hidden(0, rows.Length));
        var canvas = new Canvas(id, title, plan.About);
        using (canvas.Definitions())
        {
            Badges.Define(canvas, scene.Marks);
        }

        plot.Draw(canvas);
        Legend(canvas, circuits[0]);
        foreach (var (index, row) in rows.Index())
        {
            Row(canvas, plot, row, Top + (index * RowHeight) + (RowHeight / 2));
        }

        canvas.Line(16, Top + RowHeight, Width - 16, Top + RowHeight, "thin");
        return new Picture(id, plan.Kind, title, plan.About, canvas.Finish(size.Width, size.Height), Table(rows, isLast));
    }

    private static double Decade(double number, bool down) => Math.Pow(10, down ? Math.Floor(Math.Log10(number)) : Math.Ceiling(Math.Log10(number)));

    private void Legend(Canvas canvas, DesignSubject circuit)
    {
        var x = Left;
        foreach (var (index, reading) in plan.All(circuit.Shape, "reading").Index())
        {
            Mark(canvas, x + 6, 20, index);
            canvas.Text(x + 18, 24, reading.Label, "s");
            x += 40 + Canvas.WidthOf(reading.Label, "s");
        }

        canvas.Line(x + 6, 12, x + 6, 28, "limit");
        canvas.Text(x + 18, 24, "least permitted", "s");
    }

    private void Row(Canvas canvas, Plot plot, DesignSubject row, double y)
    {
        using var group = canvas.Subject(row.Key);
        canvas.TextWithin(16, y + 4, row.Parent is null ? "The whole installation" : Scene.Label(row), row.Parent is null ? "t b" : "t", Left - 30);
        if (plan.Number(row, "limit") is { } limit)
        {
            var x = plot.Place(limit, 0).X;
            canvas.Line(x, y - 9, x, y + 9, "limit");
        }

        var places = Readings(row).Select(reading => reading is { } number ? plot.Place(number, 0).X : (double?)null).ToArray();
        if (places.OfType<double>().ToArray() is { Length: > 1 } known)
        {
            canvas.Line(known.Min(), y, known.Max(), y, "thin");
        }

        foreach (var (index, place) in places.Index())
        {
            if (place is { } x)
            {
                Mark(canvas, x, y, index);
            }
        }

        var types = plan.Settings.Texts("clause-types");
        var standing = Standing.Of([.. scene.FindingsOf(row).Where(finding => types.Contains(finding.Rule.Clause.Type))]);
        var texts = string.Join(" / ", plan.All(row.Shape, "reading").Select(reading => reading.Show(row)));
        using var link = standing.Lead is { } lead ? canvas.Link(Anchor.Of(lead.Key), $"{Scene.Label(row)}: {texts}") : canvas.Open("g");
        if (standing.Lead is not null)
        {
            canvas.Use(Standing.Mark(standing.Lead), Right + 24, y);
        }

        canvas.TextWithin(Right + 40, y + 4, texts, row.Parent is null ? "s b" : "s", Width - Right - 50);
    }

    private static void Mark(Canvas canvas, double x, double y, int reading)
    {
        if (reading == 0)
        {
            canvas.Rect(x - 4.5, y - 4.5, 9, 9, "s2 hollow");
        }
        else
        {
            canvas.Circle(x, y, 4.5, "s1 solid");
        }
    }

    private PictureTable Table(DesignSubject[] rows, bool isLast)
    {
        var unread = isLast ? scene.Circuits.Count(circuit => Readings(circuit).All(reading => reading is null)) : 0;
        return new PictureTable(
            "Readings of the whole and of its parts." + (unread > 0 ? $" {unread} circuits have no reading and are not drawn." : ""),
            ["Part", "Name", .. plan.Headings(rows[^1].Shape, "reading"), "Least permitted"],
            [.. rows.Select(IReadOnlyList<string> (row) =>
                [row.Parent is null ? "whole" : row.Key, Scene.Name(row), .. plan.Values(row, "reading"), plan.One(row.Shape, "limit")?.Show(row) ?? ""])]);
    }
}
