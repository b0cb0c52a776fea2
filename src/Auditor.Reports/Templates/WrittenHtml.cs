using System.Text;

namespace Auditor.Reports.Templates;

/// <summary>Keeps track of where the end of the HTML written so far stands, in the report and in the parts that it includes.</summary>
internal sealed class WrittenHtml
{
    private readonly Stack<Part> _parts = new([new Part(new HtmlScanner())]);

    /// <summary>An inert text as it has to be written at the end of what has been written; null where none may stand.</summary>
    public string? Fit(string inert, StringBuilder written)
    {
        var here = At(written);
        return !here.TakesText ? null
            : here.Place == HtmlPlace.Text ? inert
            : inert.Replace("\"", "&quot;", StringComparison.Ordinal).Replace("'", "&#39;", StringComparison.Ordinal);
    }

    /// <summary>Whether markup may be put in there.</summary>
    public bool TakesMarkup(StringBuilder written) => At(written).Place == HtmlPlace.Text;

    /// <summary>Whether a file may be put in there: in a script or a style sheet.</summary>
    public bool TakesFile(StringBuilder written) => At(written).RawElement.ToUpperInvariant() is "SCRIPT" or "STYLE";

    /// <summary>A part begins. It is markup, and so may be put in between tags only.</summary>
    public void Enter() => _parts.Push(new Part(new HtmlScanner()));

    /// <summary>The part ends.</summary>
    public void Leave() => _parts.Pop();

    private HtmlScanner At(StringBuilder written)
    {
        var part = _parts.Peek();
        var text = written.ToString(part.Read, written.Length - part.Read);
        part.Read = written.Length;
        part.Scanner.Follow(text);
        return part.Scanner;
    }

    private sealed class Part(HtmlScanner scanner)
    {
        public HtmlScanner Scanner { get; } = scanner;

        public int Read { get; set; }
    }
}
