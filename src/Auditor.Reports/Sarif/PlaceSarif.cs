using Auditor.Documents;
using Auditor.Engine.Findings;
using Auditor.Engine.Installation;
using Auditor.Reports.Json;
using Auditor.Reports.Reading;

namespace Auditor.Reports.Sarif;

/// <summary>Writes places: in the files of the design, and in its tree of subjects.</summary>
internal sealed class PlaceSarif
{
    /// <summary>Name of the folder of the design, to which all its files are relative. Whoever reads the file says where it is.</summary>
    public const string Base = "DESIGN";

    /// <summary>Longer surroundings are not shown: a line may be as long as a file.</summary>
    private const int MostShown = 400;

    private readonly JsonOutput _output;
    private readonly Dictionary<string, int> _artifacts;
    private readonly Dictionary<DesignSubject, int> _subjects;

    public PlaceSarif(JsonOutput output, AuditResult result)
    {
        _output = output;
        _artifacts = output.Places.Inputs.Select((file, index) => (file.Path, index)).ToDictionary(pair => pair.Path, pair => pair.index);
        _subjects = result.Subjects.Select((subject, index) => (subject, index)).ToDictionary(pair => pair.subject, pair => pair.index);
    }

    /// <summary>The files of the design, with their hashes.</summary>
    public void Artifacts() => _output.Array("artifacts", _output.Places.Inputs, file => _output.Object(null, () =>
    {
        Artifact("location", file.Path);
        _output.Texts("roles", ["analysisTarget"]);
        _output.Text("mimeType", "application/yaml");
        _output.Text("encoding", "utf-8");
        _output.Text("sourceLanguage", "yaml");
        _output.Object("hashes", () => _output.Text("sha-256", file.Sha256));
    }));

    /// <summary>The tree of subjects.</summary>
    public void Subjects() => _output.Array("logicalLocations", _subjects.OrderBy(pair => pair.Value), pair => _output.Object(null, () =>
    {
        var subject = pair.Key;
        _output.Text("name", SubjectText.OwnName(subject) ?? subject.Key);
        _output.Text("fullyQualifiedName", subject.Key);
        _output.Text("kind", subject.Shape.Name);
        if (subject.Parent is { } parent)
        {
            _output.Whole("parentIndex", _subjects[parent]);
        }
    }));

    /// <summary>Whether a place is in one of the files of the design.</summary>
    public bool Holds(SourceSpan span) => _artifacts.ContainsKey(_output.Places.Path(span.Source.Path));

    /// <summary>A file, by its path as reports show it.</summary>
    public void Artifact(string name, string path) => _output.Object(name, () =>
    {
        _output.Text("uri", Uri(path));
        if (_artifacts.TryGetValue(path, out var index))
        {
            _output.Text("uriBaseId", Base);
            _output.Whole("index", index);
        }
    });

    /// <summary>The members of a location.</summary>
    /// <param name="span">Where it is in a file.</param>
    /// <param name="subject">Whose place it is; null for nobody's.</param>
    /// <param name="message">What is there; empty where the result itself says it.</param>
    public void Location(SourceSpan span, DesignSubject? subject, string message)
    {
        _output.Object("physicalLocation", () =>
        {
            Artifact("artifactLocation", _output.Places.Path(span.Source.Path));
            _output.Object("region", () => Region(span));
            if (Surroundings(span) is { Length: <= MostShown } lines)
            {
                _output.Object("contextRegion", () =>
                {
                    _output.Whole("startLine", span.StartLocation.Line);
                    _output.Whole("endLine", span.EndLocation.Line);
                    _output.Object("snippet", () => _output.Text("text", lines));
                });
            }
        });
        if (subject is not null)
        {
            _output.Array("logicalLocations", [subject], place => _output.Object(null, () =>
            {
                _output.Text("fullyQualifiedName", place.Key);
                _output.Text("kind", place.Shape.Name);
                _output.Whole("index", _subjects[place]);
            }));
        }

        if (message.Length > 0)
        {
            _output.Message("message", message);
        }
    }

    /// <summary>Lines and columns count from 1; the end is the column after the last character, as in the format.</summary>
    private void Region(SourceSpan span)
    {
        var (from, to) = (span.StartLocation, span.EndLocation);
        _output.Whole("startLine", from.Line);
        _output.Whole("startColumn", from.Column);
        _output.Whole("endLine", to.Line);
        _output.Whole("endColumn", to.Column);
    }

    /// <summary>The lines that a place stands in, for readers without the files.</summary>
    private static string Surroundings(SourceSpan span)
    {
        var (from, to) = (span.StartLocation.Line, span.EndLocation.Line);
        return string.Join('\n', Enumerable.Range(from, to - from + 1).Select(span.Source.LineAt));
    }

    private static string Uri(string path) => string.Join('/', path.Split('/').Select(System.Uri.EscapeDataString));
}
