using Auditor.Documents;

namespace Auditor.Engine.Installation;

/// <summary>A design file as read, with everything that it includes.</summary>
/// <param name="Path">Display path.</param>
/// <param name="Root">Its root mapping.</param>
/// <param name="Inputs">The files that were read.</param>
public sealed record DesignFile(string Path, MappingNode Root, IReadOnlyList<InputFile> Inputs)
{
    /// <summary>Reads a design file and its includes; null, with problems added, when it is not a YAML mapping.</summary>
    /// <param name="fullPath">Path to read.</param>
    /// <param name="displayPath">Path to show in problems and reports.</param>
    /// <param name="problems">Receives what is wrong.</param>
    /// <param name="texts">Texts to take for what files hold, by display path; null for none.</param>
    /// <param name="onTop">Is shown the text of the design before any of it is understood; null for nobody.</param>
    public static DesignFile? Read(
        string fullPath, string displayPath, Problems problems, IReadOnlyDictionary<string, string>? texts = null, Action<SourceText>? onTop = null)
    {
        if (DocumentLoader.Load(fullPath, displayPath, problems, texts: texts, onTop: onTop) is not { } document)
        {
            return null;
        }

        if (document.Root is MappingNode root)
        {
            return new DesignFile(displayPath, root, document.Inputs);
        }

        problems.Add(DesignMessages.NotMapping(document.Root.Span));
        return null;
    }

    /// <summary>
    /// A path as reports show it: a file of the design relative to its folder, so that nothing depends on where the audit was started;
    /// any other path as it is.
    /// </summary>
    public string Shown(string displayPath)
    {
        var folder = Path[..(Path.LastIndexOf('/') + 1)];
        var isOfDesign = displayPath == Path || (displayPath.StartsWith(folder, StringComparison.Ordinal) && Inputs.Any(input => input.Path == displayPath));
        return isOfDesign ? displayPath[folder.Length..] : displayPath;
    }

    /// <summary>The rule set that the design asks for; null where it leaves the choice open.</summary>
    public ScalarNode? RuleSet => Root.Scalar("rule-set");
}
