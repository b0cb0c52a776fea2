using Auditor.Documents;
using Auditor.Engine.Installation;

namespace Auditor.Reports.Reading;

/// <summary>
/// Names places in files as reports do: files of the design relative to its folder, so that a report does not depend on where
/// the audit was started; files of the rule set as the rule set shows them.
/// </summary>
internal sealed class Places(DesignFile file)
{
    /// <summary>File name of the design.</summary>
    public string Design { get; } = file.Shown(file.Path);

    /// <summary>The files of the design, by path.</summary>
    public IReadOnlyList<InputFile> Inputs { get; } =
        [.. file.Inputs.Select(input => input with { Path = file.Shown(input.Path) }).OrderBy(input => input.Path, StringComparer.Ordinal)];

    /// <summary>A path as reports show it.</summary>
    public string Path(string displayPath) => file.Shown(displayPath);

    /// <summary>A place that is written out already; empty where it is.</summary>
    /// <param name="place">Path, path:line or path:line:column.</param>
    public string OfText(string place)
    {
        var end = place.IndexOf(':', place.LastIndexOf('/') + 1);
        return end < 0 ? Path(place) : Path(place[..end]) + place[end..];
    }

    /// <summary>A place as <c>path:line:column</c>.</summary>
    public string Text(SourceSpan span) => $"{Path(span.Source.Path)}:{span.StartLocation}";
}
