namespace Auditor.Engine.RuleSets;

/// <summary>Keeps the paths that rule files name within a folder.</summary>
public static class Enclosure
{
    /// <summary>Whether a path lies in a folder or is it, and no symbolic link along it leads elsewhere.</summary>
    /// <param name="folder">Full path of the folder.</param>
    /// <param name="full">Full path, without dots.</param>
    public static bool Holds(string folder, string full)
    {
        var root = folder.TrimEnd('/');
        if (full != root && !full.StartsWith(root + "/", StringComparison.Ordinal))
        {
            return false;
        }

        for (var at = full; at is not null && at.Length > root.Length; at = Path.GetDirectoryName(at))
        {
            if (new FileInfo(at).LinkTarget is not null)
            {
                return false;
            }
        }

        return true;
    }
}
