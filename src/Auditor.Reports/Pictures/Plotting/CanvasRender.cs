using System.Text;
using Auditor.Reports.Pictures.Drawing;
using OxyPlot;

namespace Auditor.Reports.Pictures.Plotting;

/// <summary>
/// Draws what the plotting library asks for on a canvas: looks instead of colours, no font measured, and neighbouring lines of one look in one path, so
/// that a grid is a single element.
/// </summary>
/// <param name="canvas">Where to draw.</param>
/// <param name="looks">What the colours stand for.</param>
/// <param name="size">Size of the drawing; to keep to it needs no clipping.</param>
internal sealed class CanvasRender(Canvas canvas, Looks looks, OxySize size) : RenderContextBase
{
    private readonly Stack<IDisposable> _clips = new();
    private readonly Dictionary<string, string> _clipIds = [];
    private readonly StringBuilder _path = new();
    private string _look = "";

    /// <inheritdoc/>
    public override int ClipCount => _clips.Count;

    /// <inheritdoc/>
    public override void DrawLine(
        IList<ScreenPoint> points, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode, double[] dashArray, LineJoin lineJoin)
    {
        if (points.Count > 1 && stroke.IsVisible())
        {
            Append(points, looks.Of(stroke), "");
        }
    }

    /// <inheritdoc/>
    public override void DrawPolygon(
        IList<ScreenPoint> points, OxyColor fill, OxyColor stroke, double thickness, EdgeRenderingMode edgeRenderingMode, double[] dashArray, LineJoin lineJoin)
    {
        if (points.Count > 2 && fill.IsVisible())
        {
            Append(points, looks.Of(fill), "Z");
        }
    }

    /// <inheritdoc/>
    public override void DrawText(
        ScreenPoint p, string text, OxyColor fill, string? fontFamily, double fontSize, double fontWeight, double rotation,
        HorizontalAlignment horizontalAlignment, VerticalAlignment verticalAlignment, OxySize? maxSize)
    {
        Flush();
        var side = horizontalAlignment switch { HorizontalAlignment.Center => " c", HorizontalAlignment.Right => " e", _ => "" };
        var down = verticalAlignment switch { VerticalAlignment.Top => 10, VerticalAlignment.Middle => 4, _ => 0 };
        canvas.Text(p.X, p.Y + down, text, "s m" + side);
    }

    /// <inheritdoc/>
    public override OxySize MeasureText(string text, string? fontFamily, double fontSize, double fontWeight) =>
        string.IsNullOrEmpty(text) ? OxySize.Empty : new OxySize(Canvas.WidthOf(text, "s"), 13);

    /// <inheritdoc/>
    public override void PushClip(OxyRect clippingRectangle)
    {
        Flush();
        if (clippingRectangle.Width >= size.Width)
        {
            _clips.Push(canvas.Open("g"));
            return;
        }

        var key = $"{Canvas.N(clippingRectangle.Left)} {Canvas.N(clippingRectangle.Top)} {Canvas.N(clippingRectangle.Width)} {Canvas.N(clippingRectangle.Height)}";
        if (!_clipIds.TryGetValue(key, out var id))
        {
            id = $"{canvas.Id}-clip{_clipIds.Count + 1}";
            _clipIds.Add(key, id);
            using (canvas.Open("clipPath", ("id", id)))
            {
                canvas.Add(
                    "rect", ("x", Canvas.N(clippingRectangle.Left)), ("y", Canvas.N(clippingRectangle.Top)), ("width", Canvas.N(clippingRectangle.Width)),
                    ("height", Canvas.N(clippingRectangle.Height)));
            }
        }

        _clips.Push(canvas.Open("g", ("clip-path", $"url(#{id})")));
    }

    /// <inheritdoc/>
    public override void PopClip()
    {
        Flush();
        _clips.Pop().Dispose();
    }

    /// <summary>Writes what has been gathered.</summary>
    public void Flush()
    {
        if (_path.Length > 0)
        {
            canvas.Path(_path.ToString(), _look);
            _path.Clear();
        }
    }

    private void Append(IList<ScreenPoint> points, string look, string end)
    {
        if (look != _look)
        {
            Flush();
            _look = look;
        }

        _path.Append('M').Append(Canvas.N(points[0].X)).Append(' ').Append(Canvas.N(points[0].Y));
        for (var i = 1; i < points.Count; i++)
        {
            var (x, y) = (Canvas.N(points[i].X), Canvas.N(points[i].Y));
            var (lastX, lastY) = (Canvas.N(points[i - 1].X), Canvas.N(points[i - 1].Y));
            _ = (x == lastX, y == lastY) switch
            {
                (true, true) => _path,
                (true, _) => _path.Append('V').Append(y),
                (_, true) => _path.Append('H').Append(x),
                _ => _path.Append('L').Append(x).Append(' ').Append(y),
            };
        }

        _path.Append(end);
    }
}
