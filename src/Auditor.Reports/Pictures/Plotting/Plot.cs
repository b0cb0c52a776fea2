using Auditor.Engine.Findings;
using Auditor.Quantities;
using Auditor.Reports.Pictures.Drawing;
using OxyPlot;
using OxyPlot.Axes;
using OxyPlot.Series;

namespace Auditor.Reports.Pictures.Plotting;

/// <summary>A plot of lines over two axes, drawn on a canvas at a fixed place.</summary>
internal sealed class Plot
{
    private readonly PlotModel _model;
    private readonly Looks _looks = new();
    private readonly Axis _across;
    private readonly Axis _up;
    private readonly OxyRect _area;
    private readonly OxySize _size;

    /// <summary>Makes a plot.</summary>
    /// <param name="size">Size of the drawing.</param>
    /// <param name="area">Where its area lies in the drawing.</param>
    /// <param name="across">Its axis from left to right.</param>
    /// <param name="up">Its axis upwards.</param>
    public Plot(OxySize size, OxyRect area, Axis across, Axis up)
    {
        (_size, _area, _across, _up) = (size, area, across, up);
        _model = new PlotModel
        {
            Padding = new OxyThickness(0),
            PlotMargins = new OxyThickness(area.Left, area.Top, size.Width - area.Right, size.Height - area.Bottom),
            PlotAreaBorderThickness = new OxyThickness(0),
            Background = OxyColors.Undefined,
        };
        Style(across, AxisPosition.Bottom);
        Style(up, AxisPosition.Left);
    }

    /// <summary>A logarithmic axis.</summary>
    /// <param name="from">Where it begins, in coherent units.</param>
    /// <param name="to">Where it ends.</param>
    /// <param name="unit">Unit of its labels.</param>
    public static Axis Logarithmic(double from, double to, Unit unit) => new LogarithmicAxis
    {
        Minimum = from,
        Maximum = to,
        LabelFormatter = value => IsPowerOfTen(value) ? ValueText.ShowNumber(value, unit) : "",
        MinorGridlineStyle = LineStyle.Solid,
    };

    /// <summary>An even axis; where both begin at nil only one says so.</summary>
    /// <param name="from">Where it begins, in coherent units.</param>
    /// <param name="to">Where it ends.</param>
    /// <param name="unit">Unit of its labels.</param>
    /// <param name="isNilSaid">Whether nil has a label.</param>
    public static Axis Linear(double from, double to, Unit unit, bool isNilSaid) => new LinearAxis
    {
        Minimum = from,
        Maximum = to,
        LabelFormatter = value => value == 0 && !isNilSaid ? "" : ValueText.ShowNumber(value, unit),
    };

    /// <summary>An axis that is not drawn.</summary>
    public static Axis Hidden(double from, double to) => new LinearAxis { Minimum = from, Maximum = to, IsAxisVisible = false };

    /// <summary>Adds a line; a point that is no number breaks it.</summary>
    public void Line(IEnumerable<DataPoint> points, string look)
    {
        var line = new LineSeries { Color = _looks.Of(look) };
        line.Points.AddRange(points);
        _model.Series.Add(line);
    }

    /// <summary>Adds the area between two lines.</summary>
    public void Band(IEnumerable<DataPoint> points, IEnumerable<DataPoint> others, string look)
    {
        var band = new AreaSeries { Color = OxyColors.Undefined, Color2 = OxyColors.Undefined, StrokeThickness = 0, Fill = _looks.Of(look) };
        band.Points.AddRange(points);
        band.Points2.AddRange(others);
        _model.Series.Add(band);
    }

    /// <summary>Draws the plot; from then on places can be asked for.</summary>
    public void Draw(Canvas canvas)
    {
        var render = new CanvasRender(canvas, _looks, _size);
        IPlotModel model = _model;
        model.Update(true);
        model.Render(render, new OxyRect(0, 0, _size.Width, _size.Height));
        render.Flush();
        canvas.Path($"M{Canvas.N(_area.Left)} {Canvas.N(_area.Top)}V{Canvas.N(_area.Bottom)}H{Canvas.N(_area.Right)}", "thin");
    }

    /// <summary>Where a point lies in the drawing.</summary>
    public ScreenPoint Place(double x, double y) => new(_across.Transform(x), _up.Transform(y));

    private static bool IsPowerOfTen(double value) => Math.Abs(Math.Log10(value) - Math.Round(Math.Log10(value))) < 1e-9;

    private void Style(Axis axis, AxisPosition position)
    {
        axis.Position = position;
        axis.TickStyle = TickStyle.None;
        axis.MajorGridlineStyle = LineStyle.Solid;
        axis.MajorGridlineColor = _looks.Of("grid");
        axis.MinorGridlineColor = _looks.Of("grid faint");
        axis.AxislineStyle = LineStyle.None;
        axis.TextColor = _looks.Of("words");
        axis.MinimumPadding = 0;
        axis.MaximumPadding = 0;
        axis.IsZoomEnabled = false;
        _model.Axes.Add(axis);
    }
}
