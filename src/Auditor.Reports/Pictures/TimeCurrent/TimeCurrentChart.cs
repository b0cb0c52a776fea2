using Auditor.Engine.Installation;
using Auditor.Engine.RuleSets;
using Auditor.Formulas.Values;
using Auditor.Quantities;
using Auditor.Reports.Pictures.Drawing;
using Auditor.Reports.Pictures.Plotting;
using OxyPlot;

namespace Auditor.Reports.Pictures.TimeCurrent;

/// <summary>The time-current chart of one circuit.</summary>
/// <param name="scene">The audit.</param>
/// <param name="plan">What to show.</param>
/// <param name="circuit">The circuit.</param>
/// <param name="id">Id of the picture.</param>
internal sealed class TimeCurrentChart(Scene scene, PicturePlan plan, DesignSubject circuit, string id)
{
    private static readonly OxySize Size = new(800, 442);
    private static readonly OxyRect Area = new(60, 46, 440, 360);
    private static readonly Unit Ampere = UnitCatalog.Find("A")!;
    private static readonly Unit Second = UnitCatalog.Find("s")!;

    private static readonly string[] FaultLooks = ["line s4 dash", "line s4 close"];
    private static readonly string[] WithstandLooks = ["line s3 chain", "line s3 chains"];

    private readonly List<(string Look, string Label, string Value)> _legend = [];

    /// <summary>Draws the chart.</summary>
    /// <param name="note">What is to be said of circuits without a chart; empty for nothing.</param>
    public Picture Draw(string note)
    {
        var (least, most) = Range();
        var plot = new Plot(Size, Area, Plot.Logarithmic(least, most, Ampere), Plot.Logarithmic(DeviceBand.LeastTime, DeviceBand.MostTime, Second));
        var curves = scene.Result.Rules.World.Curves;
        var own = DeviceBand.Of(plan, circuit, "", curves, most);
        Band(plot, DeviceBand.Of(plan, circuit, "upstream-", curves, most), "s2", "device in front of the board");
        Band(plot, own.Title.Length > 0 ? own : DeviceBand.OfSetting(plan, circuit, most), "s1", "device of the circuit");
        Withstands(plot, most);
        Limits(plot, least, most);
        Faults(plot);

        var title = $"{plan.Title}: {Scene.Label(circuit)}";
        var canvas = new Canvas(id, title, plan.About);
        plot.Draw(canvas);
        Words(canvas);
        return new Picture(id, plan.Kind, title, plan.About, canvas.Finish(Size.Width, Size.Height), Table(note));
    }

    private (double Least, double Most) Range()
    {
        var currents = plan.All(circuit.Shape, "fault").Select(quantity => quantity.Of(circuit)).Where(value => value.Kind == ValueKind.Quantity)
            .Select(value => value.Number).Append(plan.Number(circuit, "rating")!.Value).Append(plan.Number(circuit, "upstream-rating") * 10 ?? 0)
            .Append(plan.Number(circuit, "setting-most") ?? 0).Where(current => current > 0).ToArray();
        return (Decade(currents.Min() * 0.9, down: true), Decade(currents.Max() * 1.1, down: false));
    }

    private static double Decade(double current, bool down) => Math.Pow(10, down ? Math.Floor(Math.Log10(current)) : Math.Ceiling(Math.Log10(current)));

    private void Band(Plot plot, DeviceBand band, string series, string label)
    {
        if (band.Slow.Count == 0)
        {
            _legend.Add(("", label, "no curve is held, or its rating is not known"));
            return;
        }

        if (band.Fast.Count > 0)
        {
            plot.Band(band.SlowSide, band.FastSide, $"{series} area");
            plot.Line(band.Fast, $"line {series} dots");
        }

        plot.Line(band.Beyond, $"thin {series} dash");
        plot.Line(band.Slow, $"line {series}" + (series == "s2" ? " long" : ""));
        _legend.Add(($"line {series}" + (series == "s2" ? " long" : ""), label, band.Title + (band.Fast.Count == 0 ? ", slow edge" : "")));
    }

    /// <summary>A joule integral is a straight line on these axes; it is drawn up to the time to which the equation holds.</summary>
    private void Withstands(Plot plot, double most)
    {
        var longest = plan.Number(circuit, "withstand-up-to") ?? DeviceBand.MostTime;
        foreach (var (index, quantity) in plan.All(circuit.Shape, "withstand").Index())
        {
            if (quantity.Of(circuit) is { Kind: ValueKind.Quantity } value)
            {
                var look = WithstandLooks[index % WithstandLooks.Length];
                plot.Line([At(longest), At(Math.Max(DeviceBand.LeastTime, value.Number / (most * most)))], look);
                _legend.Add((look, quantity.Label, quantity.Show(circuit)));

                DataPoint At(double time) => new(Math.Sqrt(value.Number / time), time);
            }
        }
    }

    private void Limits(Plot plot, double least, double most)
    {
        foreach (var quantity in plan.All(circuit.Shape, "time-limit"))
        {
            if (quantity.Of(circuit) is { Kind: ValueKind.Quantity } value)
            {
                plot.Line([new DataPoint(least, value.Number), new DataPoint(most, value.Number)], "limit");
                _legend.Add(("limit", quantity.Label, quantity.Show(circuit)));
            }
        }
    }

    private void Faults(Plot plot)
    {
        foreach (var (index, quantity) in plan.All(circuit.Shape, "fault").Index())
        {
            if (quantity.Of(circuit) is { Kind: ValueKind.Quantity } value)
            {
                var look = FaultLooks[index % FaultLooks.Length];
                plot.Line([new DataPoint(value.Number, DeviceBand.LeastTime), new DataPoint(value.Number, DeviceBand.MostTime)], look);
                _legend.Add((look, quantity.Label, quantity.Show(circuit)));
            }
        }
    }

    private void Words(Canvas canvas)
    {
        canvas.TextWithin(16, 22, Scene.Label(circuit), "t b", Area.Right - 20);
        canvas.Text(Area.Left, 38, "time", "s m e");
        canvas.Text(Area.Right, Area.Bottom + 30, "current", "s m e");
        var standing = scene.StandingOf(circuit);
        if (standing.Lead is { } lead)
        {
            using (canvas.Definitions())
            {
                Badges.Define(canvas, [Standing.Mark(lead)]);
            }

            using var link = canvas.Link(Anchor.Of(lead.Key), $"{Scene.Label(circuit)}: {lead.VerdictText}, {standing.Headline}, {standing.Topic}");
            canvas.Use(Standing.Mark(lead), Area.Right + 28, 18);
            canvas.TextWithin(Area.Right + 42, 22, $"{standing.Headline} {standing.Topic}", "t b", Size.Width - Area.Right - 52);
        }

        foreach (var (index, (look, label, value)) in _legend.Index())
        {
            var y = Area.Top + 20 + (index * 42);
            if (look.Length > 0)
            {
                canvas.Line(Area.Right + 20, y, Area.Right + 52, y, look);
            }

            canvas.TextWithin(Area.Right + 60, y + 4, label, "t", Size.Width - Area.Right - 68);
            canvas.TextWithin(Area.Right + 60, y + 19, value, "s m", Size.Width - Area.Right - 68);
        }
    }

    /// <summary>What has a name of its own; a setting that the chart only computes with has none.</summary>
    private PictureTable Table(string note) => new(
        $"What the chart of {circuit.Key} draws." + (note.Length > 0 ? " " + note : ""), ["Quantity", "Value"],
        [.. plan.Quantities.Where(quantity => quantity.Shape == circuit.Shape && quantity.Label != quantity.Formula.Text)
            .Where(quantity => quantity.IsLabelled || !quantity.Of(circuit).IsMissing)
            .Select(IReadOnlyList<string> (quantity) => [quantity.Label, quantity.Show(circuit)])]);
}
