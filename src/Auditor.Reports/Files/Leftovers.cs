using System.Collections.Concurrent;

namespace Auditor.Reports.Files;

/// <summary>Files and folders that are there only while something is done. Should the program be stopped meanwhile, they can be found and removed.</summary>
public static class Leftovers
{
    private static readonly ConcurrentDictionary<string, bool> Paths = new(StringComparer.Ordinal);

    /// <summary>Takes note of a file or folder before it is made.</summary>
    /// <param name="path">Its full path.</param>
    public static void Expect(string path) => Paths.TryAdd(path, true);

    /// <summary>Removes a file, or a folder with all that is in it.</summary>
    /// <param name="path">Its full path.</param>
    /// <returns>Whether it is gone, or never was there.</returns>
    public static bool Remove(string path)
    {
        Paths.TryRemove(path, out _);
        try
        {
            if (Directory.Exists(path))
            {
                Directory.Delete(path, recursive: true);
            }

            File.Delete(path);
            return true;
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            return false;
        }
    }

    /// <summary>Removes all that was noted and is not removed yet.</summary>
    public static void RemoveAll()
    {
        foreach (var path in Paths.Keys)
        {
            Remove(path);
        }
    }
}
