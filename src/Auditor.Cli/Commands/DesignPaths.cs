using Auditor.Documents;

namespace Auditor.Cli.Commands;

/// <summary>Finds the design files that the caller means.</summary>
internal static class DesignPaths
{
    /// <summary>Ending of a design file's name.</summary>
    public const string Ending = ".design.yaml";

    /// <summary>The files named, and every design file below the folders named, each once, in order of path within each argument.</summary>
    public static IReadOnlyList<string> Expand(IReadOnlyList<string> arguments, Problems problems)
    {
        var found = new List<string>();
        foreach (var argument in arguments)
        {
            var path = Tidy(argument);
            if (!Directory.Exists(path))
            {
                found.Add(path);
                continue;
            }

            if (Below(path) is not { } below)
            {
                problems.Add(CommandMessages.UnreadableFolder(argument));
                continue;
            }

            if (below.Length == 0)
            {
                problems.Add(CommandMessages.NoDesigns(argument));
            }

            found.AddRange(below);
        }

        return [.. found.Distinct(StringComparer.Ordinal)];
    }

    /// <summary>Every design file below a folder, in order; null when a folder there cannot be looked into, and a design in it would be passed over.</summary>
    private static string[]? Below(string folder)
    {
        var options = new EnumerationOptions { RecurseSubdirectories = true, AttributesToSkip = FileAttributes.ReparsePoint, IgnoreInaccessible = false };
        try
        {
            return [.. Directory.EnumerateFiles(folder, "*" + Ending, options).Select(Tidy).Order(StringComparer.Ordinal)];
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            return null;
        }
    }

    /// <summary>The design's path without its ending, which names the reports beside it.</summary>
    public static string BaseName(string path) =>
        path.EndsWith(Ending, StringComparison.Ordinal) ? path[..^Ending.Length] : Path.ChangeExtension(path, null);

    /// <summary>A path as it is shown: with forward slashes, and without a dot before it.</summary>
    public static string Tidy(string path)
    {
        var shown = path.Replace('\\', '/');
        return shown.StartsWith("./", StringComparison.Ordinal) ? shown[2..] : shown;
    }
}
