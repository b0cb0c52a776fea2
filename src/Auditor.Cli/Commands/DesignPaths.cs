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

            var options = new EnumerationOptions { RecurseSubdirectories = true, AttributesToSkip = FileAttributes.ReparsePoint };
            var below = Directory.EnumerateFiles(path, "*" + Ending, options).Select(Tidy).Order(StringComparer.Ordinal).ToArray();
            if (below.Length == 0)
            {
                problems.Add(CommandMessages.NoDesigns(argument));
            }

            found.AddRange(below);
        }

        return [.. found.Distinct(StringComparer.Ordinal)];
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
