using Auditor.Documents;
using Auditor.Engine.Installation;

namespace Auditor.Reports.Reading;

/// <summary>
/// Names places in files as reports do: files of the design relative to its folder, so that a report does not depend on where
/// the audit was started; files of the rule set as the rule set shows them.
/// </summary>
internal sealed class Places
{
    private readonly string _folder;
    private readonly HashSet<string> _ofDesign;

    public Places(DesignFile file)
    {
        _folder = file.Path[..(file.Path.LastIndexOf('/') + 1)];
        _ofDesign = [.. file.Inputs.Select(input => input.Path), file.Path];
        Design = Path(file.Path);
        Inputs = [.. file.Inputs.Select(input => input with { Path = Path(input.Path) }).OrderBy(input => input.Path, StringComparer.Ordinal)];
    }

    /// <summary>File name of the design.</summary>
    public string Design { get; }

    /// <summary>The files of the design, by path.</summary>
    public IReadOnlyList<InputFile> Inputs { get; }

    /// <summary>A path as reports show it.</summary>
    public string Path(string displayPath) =>
        _ofDesign.Contains(displayPath) && displayPath.StartsWith(_folder, StringComparison.Ordinal) ? displayPath[_folder.Length..] : displayPath;

    /// <summary>A place as <c>path:line:column</c>.</summary>
    public string Text(SourceSpan span) => $"{Path(span.Source.Path)}:{span.StartLocation}";
}
