using Auditor.Documents;
using Auditor.Reports.Files;

namespace Auditor.Cli.Revisions;

/// <summary>The files of a commit that may matter to a design, in a folder of their own that goes when it is disposed.</summary>
internal sealed class RevisionTree : IDisposable
{
    /// <summary>More files than that are no design and its rules.</summary>
    private const int MostFiles = 20_000;

    /// <summary>More bytes than that are no design and its rules.</summary>
    private const long MostBytes = 256L * 1024 * 1024;

    private RevisionTree(string folder)
    {
        Folder = folder;
        Leftovers.Expect(folder);
    }

    /// <summary>Full path of the folder.</summary>
    public string Folder { get; }

    /// <summary>Writes the files of a commit; null with problems added when that cannot be done.</summary>
    /// <param name="revision">The commit.</param>
    /// <param name="files">Its files.</param>
    /// <param name="name">What the user called the revision.</param>
    /// <param name="problems">Receives the reason.</param>
    public static RevisionTree? Write(GitRevision revision, IReadOnlyList<GitFile> files, string name, Problems problems)
    {
        if (files.Count > MostFiles || files.Sum(file => file.Bytes) > MostBytes)
        {
            problems.Add(RevisionMessages.TooMuch(name, MostFiles, MostBytes / (1024 * 1024)));
            return null;
        }

        var tree = new RevisionTree(Directory.CreateTempSubdirectory("auditor-").FullName);
        try
        {
            if (revision.Read(files, tree.Put))
            {
                return tree;
            }

            problems.Add(RevisionMessages.NotRead(name));
        }
        catch (Exception fault) when (fault is IOException or UnauthorizedAccessException)
        {
            problems.Add(RevisionMessages.NotWritten(name));
        }

        tree.Dispose();
        return null;
    }

    public void Dispose()
    {
        if (!Leftovers.Remove(Folder))
        {
            Serilog.Log.Warning("The temporary folder of a revision could not be removed");
        }
    }

    private void Put(GitFile file, byte[] content)
    {
        var full = Path.Combine(Folder, file.Path);
        Directory.CreateDirectory(Path.GetDirectoryName(full)!);
        File.WriteAllBytes(full, content);
    }
}
