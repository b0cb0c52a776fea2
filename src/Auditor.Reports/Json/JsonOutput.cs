using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Json;
using Auditor.Documents;
using Auditor.Formulas.Values;
using Auditor.Quantities;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Json;

/// <summary>Writes the things that findings files are made of. The same values give the same bytes on every machine.</summary>
internal sealed class JsonOutput(Stream stream, Places? places = null) : IDisposable
{
    /// <summary>
    /// Numbers are rounded to so many digits: the last bits of powers, roots and logarithms differ between machines.
    /// </summary>
    private const string TwelveDigits = "E11";

    /// <summary>So many bytes are kept before they go to the stream.</summary>
    private const int MostPending = 1 << 16;

    private readonly Utf8JsonWriter _writer = new(stream, new JsonWriterOptions
    {
        Indented = true,
        NewLine = "\n",
        // The file stands by itself, never inside a web page: only what JSON itself asks for is escaped.
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    });

    /// <summary>How spans are shown; to be given where spans are written.</summary>
    public Places Places => places ?? throw new InvalidOperationException("this output was not told how to show spans");

    public void Object(string? name, Action members)
    {
        Name(name);
        _writer.WriteStartObject();
        members();
        _writer.WriteEndObject();
    }

    /// <summary>An object made of something; null where there is nothing.</summary>
    public void Nullable<T>(string name, T? thing, Action<T> members)
        where T : class
    {
        if (thing is null)
        {
            Null(name);
        }
        else
        {
            Object(name, () => members(thing));
        }
    }

    public void Array<T>(string? name, IEnumerable<T> items, Action<T> item)
    {
        Name(name);
        _writer.WriteStartArray();
        foreach (var each in items)
        {
            item(each);
            if (_writer.BytesPending > MostPending)
            {
                _writer.Flush();
            }
        }

        _writer.WriteEndArray();
    }

    public void Texts(string name, IEnumerable<string> texts) => Array(name, texts, text => _writer.WriteStringValue(text));

    /// <summary>A text; null stays null.</summary>
    public void Text(string name, string? text) => _writer.WriteString(name, text);

    /// <summary>A text of which the empty one says nothing, and is null.</summary>
    public void TextOrNull(string name, string text) => Text(name, text.Length == 0 ? null : text);

    public void Whole(string? name, int number)
    {
        Name(name);
        _writer.WriteNumberValue(number);
    }

    public void Flag(string name, bool flag) => _writer.WriteBoolean(name, flag);

    public void Null(string name) => _writer.WriteNull(name);

    /// <summary>A number, rounded; null stays null.</summary>
    public void Number(string name, double? number)
    {
        if (number is null)
        {
            _writer.WriteNull(name);
        }
        else
        {
            _writer.WriteNumber(name, Rounded(number.Value));
        }
    }

    /// <summary>A value in a unit; null where it is missing.</summary>
    public void Value(string? name, in Value value, Unit? unit)
    {
        Name(name);
        switch (value.Kind)
        {
            case ValueKind.Missing:
                _writer.WriteNullValue();
                break;
            case ValueKind.Quantity:
                _writer.WriteNumberValue(Rounded((unit ?? Unit.One).FromCoherent(value.Number)));
                break;
            case ValueKind.Flag:
                _writer.WriteBooleanValue(value.Flag);
                break;
            case ValueKind.Words:
                _writer.WriteStringValue(string.Join(", ", value.Words));
                break;
            default:
                _writer.WriteStringValue(value.Text);
                break;
        }
    }

    /// <summary>A place in a file; null where there is none.</summary>
    public void Location(SourceSpan? span)
    {
        if (span is { } at)
        {
            Location(Places.Path(at.Source.Path), at.StartLocation);
        }
        else
        {
            _writer.WriteNull("location");
        }
    }

    /// <summary>A place in a file.</summary>
    public void Location(string file, Location at) => Object("location", () =>
    {
        Text("file", file);
        Whole("line", at.Line);
        Whole("column", at.Column);
    });

    public void Dispose() => _writer.Dispose();

    private static double Rounded(double number)
    {
        var rounded = double.Parse(number.ToString(TwelveDigits, CultureInfo.InvariantCulture), CultureInfo.InvariantCulture);
        return rounded == 0 ? 0 : rounded;
    }

    private void Name(string? name)
    {
        if (name is not null)
        {
            _writer.WritePropertyName(name);
        }
    }
}
