using System.Globalization;
using System.Text;
using System.Xml;
using System.Xml.Linq;
using Auditor.Reports.Templates;

namespace Auditor.Reports.Pictures.Drawing;

/// <summary>
/// A drawing in SVG while it is made. Texts and attributes go in as data and are written by an XML writer; coordinates have one decimal at the
/// most. Colours are left to classes.
/// </summary>
internal sealed class Canvas
{
    /// <summary>Size of a small text (a look that begins with <c>s</c>); the class of it says the same.</summary>
    private const double Small = 11;

    /// <summary>Size of any other text.</summary>
    private const double Ordinary = 12;

    private static readonly XNamespace Svg = "http://www.w3.org/2000/svg";

    private readonly Stack<XElement> _open = new();
    private readonly XElement _root;

    /// <summary>Starts a drawing.</summary>
    /// <param name="id">Id of the picture; every id inside starts with it.</param>
    /// <param name="title">Its title.</param>
    /// <param name="description">Its description.</param>
    public Canvas(string id, string title, string description)
    {
        Id = id;
        _root = new XElement(
            Svg + "svg", new XAttribute("id", id), new XAttribute("class", Classes("picture")), new XAttribute("role", "img"),
            new XAttribute("aria-labelledby", $"{id}-t {id}-d"),
            new XElement(Svg + "title", new XAttribute("id", id + "-t"), Inert(title)),
            new XElement(Svg + "desc", new XAttribute("id", id + "-d"), Inert(description)));
        _open.Push(_root);
    }

    /// <summary>Id of the picture.</summary>
    public string Id { get; }

    /// <summary>A number as coordinates are written.</summary>
    public static string N(double number)
    {
        var rounded = Math.Round(number, 1, MidpointRounding.AwayFromZero);
        return (rounded == 0 ? 0 : rounded).ToString("0.#", CultureInfo.InvariantCulture);
    }

    /// <summary>Text that shows as it is: one line, with � for what shows nothing or turns the text around.</summary>
    public static string Inert(string text) => Ink.OneLine(text);

    /// <summary>Width that a text may take.</summary>
    public static double WidthOf(string text, string look) => TextWidth.Of(text, SizeOf(look));

    /// <summary>A straight line.</summary>
    public void Line(double x1, double y1, double x2, double y2, string look)
    {
        var to = (x1 == x2, y1 == y2) switch
        {
            (_, true) => $"H{N(x2)}",
            (true, _) => $"V{N(y2)}",
            _ => $"L{N(x2)} {N(y2)}",
        };
        Path($"M{N(x1)} {N(y1)}{to}", look);
    }

    /// <summary>A path in the notation of SVG.</summary>
    public void Path(string data, string look) => Add("path", ("class", Classes(look)), ("d", data));

    /// <summary>A rectangle.</summary>
    public void Rect(double x, double y, double width, double height, string look, double round = 0) => Add(
        "rect", ("class", Classes(look)), ("x", N(x)), ("y", N(y)), ("width", N(width)), ("height", N(height)), ("rx", round == 0 ? null : N(round)));

    /// <summary>A circle.</summary>
    public void Circle(double x, double y, double radius, string look) => Add("circle", ("class", Classes(look)), ("cx", N(x)), ("cy", N(y)), ("r", N(radius)));

    /// <summary>A text on one line.</summary>
    public void Text(double x, double y, string text, string look)
    {
        if (text.Length > 0)
        {
            _open.Peek().Add(new XElement(Svg + "text", new XAttribute("class", Classes(look)), new XAttribute("x", N(x)), new XAttribute("y", N(y)), Inert(text)));
        }
    }

    /// <summary>A text cut to the room that it has; a cut one shows whole to whoever points at it.</summary>
    public void TextWithin(double x, double y, string text, string look, double room)
    {
        var fitted = TextWidth.Fit(text, SizeOf(look), room);
        Text(x, y, fitted, look);
        if (fitted != text)
        {
            ((XElement)_open.Peek().LastNode!).AddFirst(new XElement(Svg + "title", Inert(text)));
        }
    }

    /// <summary>A symbol that was defined in this drawing.</summary>
    public void Use(string symbol, double x, double y) =>
        Add("use", ("href", $"#{Id}-{symbol}"), ("x", N(x)), ("y", N(y)));

    /// <summary>Opens the definition of a symbol.</summary>
    public IDisposable Define(string symbol) => Open("g", ("id", $"{Id}-{symbol}"));

    /// <summary>Opens the list of definitions.</summary>
    public IDisposable Definitions() => Open("defs");

    /// <summary>Opens a group for a subject.</summary>
    public IDisposable Subject(string key) => Open("g", ("data-subject", key));

    /// <summary>Opens a link within the page; the drawing then is a group and no longer an image, whose inside nobody could reach.</summary>
    /// <param name="id">Id of the target.</param>
    /// <param name="label">What it leads to, in words.</param>
    public IDisposable Link(string id, string label)
    {
        _root.SetAttributeValue("role", "group");
        var link = Open("a", ("href", "#" + id));
        _open.Peek().Add(new XElement(Svg + "title", Inert(label)));
        return link;
    }

    /// <summary>Opens an element.</summary>
    public IDisposable Open(string name, params (string Name, string? Value)[] attributes)
    {
        var element = Add(name, attributes);
        _open.Push(element);
        return new Closing(() => _open.Pop());
    }

    /// <summary>The finished drawing.</summary>
    public string Finish(double width, double height)
    {
        _root.SetAttributeValue("viewBox", $"0 0 {N(width)} {N(height)}");
        _root.SetAttributeValue("width", N(width));
        _root.SetAttributeValue("height", N(height));
        var text = new StringBuilder();
        using (var xml = XmlWriter.Create(text, new XmlWriterSettings { OmitXmlDeclaration = true, Indent = false, NewLineHandling = NewLineHandling.None }))
        {
            _root.Save(xml);
        }

        return text.ToString();
    }

    /// <summary>Adds an element; attributes without a value are left out.</summary>
    public XElement Add(string name, params (string Name, string? Value)[] attributes)
    {
        var element = new XElement(
            Svg + name, attributes.Where(attribute => attribute.Value is not null).Select(attribute => new XAttribute(attribute.Name, Inert(attribute.Value!))));
        _open.Peek().Add(element);
        return element;
    }

    /// <summary>Size by which a text is measured; bold letters are wider.</summary>
    private static double SizeOf(string look) => (look.StartsWith('s') ? Small : Ordinary) * (look.Contains(" b", StringComparison.Ordinal) ? 1.14 : 1);

    /// <summary>The classes of a look. Their prefix keeps them apart from those of the page: selectors cannot, since nothing reaches into a used symbol.</summary>
    private static string Classes(string look) => string.Join(' ', look.Split(' ').Select(part => "p-" + part));

    private sealed class Closing(Action close) : IDisposable
    {
        public void Dispose() => close();
    }
}
