using System.Buffers;
using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Json;
using Auditor.Documents;
using Auditor.Formulas.Values;
using Auditor.Quantities;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Json;

/// <summary>Writes the things that findings files are made of. The same values give the same bytes on every machine.</summary>
internal sealed class JsonOutput : IDisposable
{
    /// <summary>
    /// Numbers are rounded to so many digits: the last bits of powers, roots and logarithms differ between machines.
    /// </summary>
    private const string TwelveDigits = "E11";

    private const int LongestNumber = 32;

    /// <summary>Blanks before a line for each object or list that is open.</summary>
    private const int IndentOfDepth = 2;

    /// <summary>So many are open within a list at the top of the file.</summary>
    private const int DepthOfList = 2;

    /// <summary>Whole numbers below this one have no more digits than are kept.</summary>
    private const double MostWhole = 1e12;

    /// <summary>So many bytes are kept before they go to the stream.</summary>
    private const int MostPending = 1 << 16;

    /// <summary>The file stands by itself, never inside a web page: only what JSON itself asks for is escaped.</summary>
    private static readonly JavaScriptEncoder Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping;

    /// <summary>The lines of the file; null where records are only gathered.</summary>
    private readonly Utf8JsonWriter? _lines;

    /// <summary>The record that is being made, after those gathered.</summary>
    private readonly ArrayBufferWriter<byte> _record = new();
    private readonly List<int> _ends = [];
    private readonly Utf8JsonWriter _compact;
    private readonly Places? _places;

    /// <summary>Where things go at the moment: to the lines of the file, or into the record that is being made.</summary>
    private Utf8JsonWriter _writer;

    /// <summary>Makes an output.</summary>
    /// <param name="stream">Receives the file; null to gather records, which <see cref="Gathered"/> of another output then takes.</param>
    /// <param name="places">How spans are shown; null where none are written.</param>
    public JsonOutput(Stream? stream, Places? places = null)
    {
        _lines = stream is null ? null : new Utf8JsonWriter(stream, new JsonWriterOptions { Indented = true, NewLine = "\n", Encoder = Encoder });
        _compact = new Utf8JsonWriter(_record, new JsonWriterOptions { Encoder = Encoder });
        _writer = _lines ?? _compact;
        _places = places;
    }

    /// <summary>How spans are shown; to be given where spans are written.</summary>
    public Places Places => _places ?? throw new InvalidOperationException("this output was not told how to show spans");

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

    /// <summary>Begins an object: what every finding has is written without an action for each part of it.</summary>
    public void Start(string? name)
    {
        Name(name);
        _writer.WriteStartObject();
    }

    /// <summary>Ends the object begun last.</summary>
    public void End() => _writer.WriteEndObject();

    /// <summary>An object that takes one line of the file.</summary>
    public void Record(string? name, Action members)
    {
        _writer = _compact;
        if (name is null)
        {
            NewLine();
        }

        _writer.WriteStartObject();
        members();
        _writer.WriteEndObject();
        _compact.Flush();
        _compact.Reset();
        if (_lines is null)
        {
            _ends.Add(_record.WrittenCount);
            return;
        }

        _writer = _lines;
        Name(name);
        _writer.WriteRawValue(_record.WrittenSpan, skipInputValidation: true);
        _record.ResetWrittenCount();
    }

    /// <summary>A list of objects of which each takes one line of the file.</summary>
    public void Records<T>(string name, IEnumerable<T> items, Action<T> members) => Array(name, items, item => Record(null, () => members(item)));

    /// <summary>Forgets the records gathered.</summary>
    public void Clear()
    {
        _record.ResetWrittenCount();
        _ends.Clear();
    }

    /// <summary>A list of records that other outputs gathered.</summary>
    public void Gathered(string name, IEnumerable<JsonOutput> outputs) => Array(name, outputs, output =>
    {
        var start = 0;
        foreach (var end in output._ends)
        {
            _writer.WriteRawValue(output._record.WrittenSpan[start..end], skipInputValidation: true);
            start = end;
        }
    });

    public void Array<T>(string? name, IEnumerable<T> items, Action<T> item)
    {
        Name(name);
        _writer.WriteStartArray();
        foreach (var each in items)
        {
            item(each);
            if (_lines?.BytesPending > MostPending)
            {
                _lines.Flush();
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

    /// <summary>A whole number; null stays null.</summary>
    public void WholeOrNull(string name, int? number)
    {
        if (number is { } given)
        {
            _writer.WriteNumber(name, given);
        }
        else
        {
            Null(name);
        }
    }

    /// <summary>A list of whole numbers.</summary>
    public void Wholes(string name, IReadOnlyList<int> numbers) => Array(name, numbers, number => _writer.WriteNumberValue(number));

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
    public void Location(string file, Location at)
    {
        Start("location");
        Text("file", file);
        Whole("line", at.Line);
        Whole("column", at.Column);
        End();
    }

    public void Dispose()
    {
        _lines?.Dispose();
        _compact.Dispose();
    }

    private static double Rounded(double number)
    {
        if (Math.Abs(number) < MostWhole && Math.Truncate(number) == number)
        {
            return number == 0 ? 0 : number;
        }

        Span<char> text = stackalloc char[LongestNumber];
        number.TryFormat(text, out var length, TwelveDigits, CultureInfo.InvariantCulture);
        return double.Parse(text[..length], CultureInfo.InvariantCulture);
    }

    /// <summary>Begins a line for an item of a list: those gathered are for a list that stands at the top of the file.</summary>
    private void NewLine()
    {
        var length = 1 + (IndentOfDepth * (_lines?.CurrentDepth ?? DepthOfList));
        var line = _record.GetSpan(length)[..length];
        line.Fill((byte)' ');
        line[0] = (byte)'\n';
        _record.Advance(line.Length);
    }

    private void Name(string? name)
    {
        if (name is not null)
        {
            _writer.WritePropertyName(name);
        }
    }
}
